/** What is on the wall of a home, as its age and the works done to it make likely. */
import { type BoardType } from '@/lib/homes/board-type'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type Wiring } from '@/lib/homes/wiring'
import { seededRandom, type SeededRandom } from '../seeded-random'
import { type Era } from '../town/street'
import { ERA_HABITS } from './era-habits'

export type Installation = {
  readonly built: number
  readonly builtAbout: boolean
  readonly rewired: number | null
  /** the year of the consumer unit that is there now */
  readonly unitFitted: number
  readonly boardType: Exclude<BoardType, 'unknown'>
  readonly rcdCover: Exclude<RcdCover, 'unknown'>
  readonly wiring: Exclude<Wiring, 'unknown'>
  readonly ways: string
}

const BOARDS: readonly (readonly [until: number, weights: Partial<Record<BoardType, number>>])[] = [
  [1965, { rewireable: 84, cartridge: 10, mixed: 6 }],
  [1980, { rewireable: 50, cartridge: 11, mixed: 8, breakers: 31 }],
  [1991, { rewireable: 14, cartridge: 10, mixed: 6, breakers: 70 }],
  [2007, { breakers: 95, mixed: 3, rcbo: 2 }],
  [2017, { breakers: 88, rcbo: 12 }],
  [9999, { rcbo: 74, breakers: 26 }],
]

/** A street's works were done together: the street, not the home, decides whether the programme came, and when. */
function programmeOf(era: Era, street: string): number | null {
  const random = seededRandom(`programme of ${street}`)
  const { share, years } = ERA_HABITS[era].programme
  return random.chance(share) ? random.whole(...years) : null
}

function coverOf(board: BoardType, fitted: number, random: SeededRandom): Installation['rcdCover'] {
  if (board === 'mixed') return 'part'
  if (board === 'rcbo') return 'all'
  if (board !== 'breakers') return random.weighted({ none: 82, sockets: 18 })
  if (fitted <= 1991) return random.weighted({ none: 62, part: 38 })
  if (fitted <= 2007) return random.weighted({ sockets: 70, part: 18, none: 4, all: 8 })
  return random.weighted({ all: 88, part: 12 })
}

const repeated = (letter: string, count: number) => letter.repeat(Math.max(0, count))

/** The board strip code of a board with that many ways in use. */
function waysCode(board: BoardType, cover: RcdCover, ways: number, random: SeededRandom): string {
  const blank = random.chance(0.3) ? 'X' : ''
  if (board === 'rewireable') return repeated('R', ways) + blank
  if (board === 'cartridge') return repeated('C', ways) + blank
  if (board === 'rcbo') return repeated('O', ways) + blank
  if (board === 'mixed') {
    const kept = random.whole(2, Math.max(2, ways - 2))
    return `${repeated('R', kept)}[${repeated('B', Math.max(1, ways - kept))}]`
  }
  const half = Math.ceil(ways / 2)
  if (cover === 'all') return `[${repeated('B', half)}][${repeated('B', ways - half)}${blank}]`
  if (cover === 'none') return repeated('B', ways) + blank
  return `[${repeated('B', half)}]${repeated('B', ways - half)}${blank}`
}

function wiringOf(
  wired: number,
  tower: boolean,
  partly: boolean,
  random: SeededRandom,
): Installation['wiring'] {
  if (tower && wired < 1975) return 'mineral'
  if (wired < 1960) return random.weighted({ rubber: 80, lead: 20 })
  if (wired < 1967) return random.weighted({ rubber: 45, pvc: 45, mixed: 10 })
  return partly ? 'mixed' : 'pvc'
}

/**
 * The installation of one home.
 * @param home its age, its street or block, and its rooms; `key` makes it this home's and no other's
 * @param lastYear no works are later than this
 */
export function installationOf(
  home: { key: string; era: Era; street: string; built: number | null; tower: boolean; bedrooms: number },
  lastYear: number,
): Installation {
  const random = seededRandom(`installation of ${home.key}`)
  const habit = ERA_HABITS[home.era]
  const streetBuilt = home.built ?? seededRandom(`built ${home.street}`).whole(...habit.built)
  const built = Math.min(lastYear - 1, streetBuilt + (home.built === null ? random.whole(0, 2) : 0))
  const programme = programmeOf(home.era, home.street)
  // one home in seven was out, or refused, when the programme came
  const reached = programme !== null && programme > built + 15 && programme <= lastYear && random.chance(0.86)
  const first = habit.firstWired ? random.whole(...habit.firstWired) : built
  const rewired = reached ? programme : habit.firstWired ? first : null
  const wired = rewired ?? built
  const { share, years } = habit.newUnit
  const later = random.chance(share) ? Math.min(lastYear, random.whole(...years)) : 0
  const unitFitted = Math.max(wired, later)
  const weights = BOARDS.find(([until]) => unitFitted <= until)?.[1] ?? { breakers: 1 }
  const boardType = random.weighted(weights) as Installation['boardType']
  const rcdCover = coverOf(boardType, unitFitted, random)
  const ways = (unitFitted < 1980 ? 3 : 5) + Math.min(4, home.bedrooms) + random.whole(0, 1)
  return {
    built,
    builtAbout: habit.about,
    rewired,
    unitFitted,
    boardType,
    rcdCover,
    wiring: wiringOf(wired, home.tower, random.chance(0.08), random),
    ways: waysCode(boardType, rcdCover, ways, random),
  }
}
