import { boardTypeOfWays } from '@/lib/electrical/board-type-of-ways'
import { waysOf } from '@/lib/electrical/consumer-unit'
import { rcdCoverOfWays } from '@/lib/electrical/rcd-cover-of-ways'
import { type BoardType } from '@/lib/homes/board-type'
import { type Fact } from '@/lib/homes/fact'
import { readFactValue } from '@/lib/homes/fact-value'
import { type RcdCover } from '@/lib/homes/rcd-cover'

export type Board = {
  readonly boardType: BoardType
  readonly rcdCover: RcdCover
  readonly ways: string | null
}

/** Which of two boards is the worse news, by common practice: the older the protection, the worse. */
const WORSE_NEWS: Record<BoardType, number> = {
  unknown: 0,
  rcbo: 1,
  breakers: 2,
  cartridge: 3,
  mixed: 4,
  rewireable: 4,
}

/**
 * A home's board from three facts that may have come at different times: its type, its ways and its RCD
 * cover. Each fills what the other leaves open. Where type and ways contradict each other the later one
 * holds, and where neither is later, the worse news; ways that do not hold are left out,
 * so that the board strip never shows another board than the words beside it.
 * @param facts the current ones; at most one of a kind
 * @throws Invalid where a stored value is none of its kind
 */
export function boardOfFacts(facts: readonly Fact[]): Board {
  const typeFact = facts.find((fact) => fact.kind === 'board-type')
  const waysFact = facts.find((fact) => fact.kind === 'ways')
  const coverFact = facts.find((fact) => fact.kind === 'rcd-cover')
  const toldType = readFactValue('board-type', typeFact?.value ?? null).value
  const toldCover = readFactValue('rcd-cover', coverFact?.value ?? null).value
  const code = readFactValue('ways', waysFact?.value ?? null).value
  const ways = code === null ? null : waysOf(code)
  if (ways === null) return { boardType: toldType, rcdCover: toldCover, ways: null }

  const shownType = boardTypeOfWays(ways)
  const contradict = toldType !== 'unknown' && shownType !== 'unknown' && toldType !== shownType
  if (contradict && isLaterOrWorse(typeFact, toldType, waysFact, shownType)) {
    return { boardType: toldType, rcdCover: toldCover, ways: null }
  }
  return {
    boardType: shownType === 'unknown' ? toldType : shownType,
    rcdCover: toldCover === 'unknown' ? rcdCoverOfWays(ways) : toldCover,
    ways: code,
  }
}

function isLaterOrWorse(
  type: Fact | undefined,
  told: BoardType,
  ways: Fact | undefined,
  shown: BoardType,
): boolean {
  const typeDay = type?.asOf?.day ?? ''
  const waysDay = ways?.asOf?.day ?? ''
  return typeDay === waysDay ? WORSE_NEWS[told] > WORSE_NEWS[shown] : typeDay > waysDay
}
