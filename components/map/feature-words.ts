/** What a marker stands for, in a line of words. */
import { BOARD_TYPE_NAMES } from '@/lib/homes/board-type'
import { type Cluster, type HomePoint } from './homes-on-map'

/** Above so many features, markers would cover each other and slow the map: dots are drawn. */
export const MOST_MARKERS = 300

const whole = (n: number) => Math.round(n).toLocaleString('en-GB')

/**
 * A home.
 * @example homeInWords(home) // '4 Plumb Lane: rewireable fuses, lapsed, score 1,204'
 */
export const homeInWords = (home: HomePoint): string =>
  `${home.address}: ${BOARD_TYPE_NAMES[home.boardType].replace(/^[A-Z](?![A-Z])/, (letter) => letter.toLowerCase())}, ${home.standing}, score ${whole(home.score)}`

/**
 * Several homes.
 * @example clusterInWords(cluster) // '38 homes: 9 with rewireable fuses, 4 not known; highest score 1,204'
 */
export const clusterInWords = ({ homes, boards, highestScore }: Cluster): string =>
  `${whole(homes)} homes: ${whole(boards.rewireable + boards.mixed)} with rewireable fuses, ${whole(boards.unknown)} not known; highest score ${whole(highestScore)}`
