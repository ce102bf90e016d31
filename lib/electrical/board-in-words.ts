import { BOARD_TYPE_NAMES, type BoardType } from '@/lib/homes/board-type'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { waysOf } from './consumer-unit'
import { waysInWords } from './ways-in-words'

const COVER_WORDS: Record<RcdCover, string> = {
  none: 'no RCD',
  sockets: 'RCD on the sockets only',
  part: 'RCD on some circuits',
  all: 'RCD on all circuits',
  unknown: 'RCD cover not known',
}

/**
 * What is on the wall, in words: the text beside or instead of the board strip.
 * @param ways board strip code; null where only the type is known
 * @example boardInWords({ ways: 'RRRRRU', boardType: 'rewireable', rcdCover: 'none' }) // '6 ways: 5 rewireable, 1 not known; no RCD'
 * @example boardInWords({ ways: null, boardType: 'rewireable', rcdCover: 'none' }) // 'Rewireable fuses, number of ways not known; no RCD'
 */
export function boardInWords({
  ways,
  boardType,
  rcdCover,
}: {
  ways: string | null
  boardType: BoardType
  rcdCover: RcdCover
}): string {
  const known = ways === null ? null : waysOf(ways)
  return `${known ? waysInWords(known) : typeInWords(boardType)}; ${COVER_WORDS[rcdCover]}`
}

function typeInWords(boardType: BoardType): string {
  if (boardType === 'unknown') return 'Consumer unit not known'
  return `${BOARD_TYPE_NAMES[boardType]}, number of ways not known`
}
