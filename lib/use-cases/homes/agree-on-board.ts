import { boardTypeOfWays } from '@/lib/electrical/board-type-of-ways'
import { waysOf } from '@/lib/electrical/consumer-unit'
import { rcdCoverOfWays } from '@/lib/electrical/rcd-cover-of-ways'
import { waysInWords } from '@/lib/electrical/ways-in-words'
import { type FieldProblem, Invalid } from '@/lib/errors/expected'
import { BOARD_TYPE_NAMES, type BoardType } from '@/lib/homes/board-type'
import { type Fact, type FactKind } from '@/lib/homes/fact'
import { RCD_COVER_NAMES, type RcdCover } from '@/lib/homes/rcd-cover'

type Correction = Pick<Fact, 'kind' | 'value' | 'asOf' | 'note'>
type Known = ReadonlyMap<FactKind, { readonly value: string | null }>

const knows = (value: string | null | undefined): value is string =>
  typeof value === 'string' && value !== 'unknown'

/** Whether a cover can be that of these ways. Where they show no RCD, one may still stand outside the board. */
const coverAgrees = (told: string, shown: RcdCover) =>
  shown === 'unknown' || told === shown || (shown === 'part' && told === 'sockets')

/**
 * Keeps the three facts of a consumer unit in agreement. New ways bring the type and cover that they show, unless
 * these are given beside them; then all three must agree. A type or cover given alone must agree with the ways on record.
 * @returns the corrections, with those that the ways bring
 * @throws Invalid saying what contradicts what
 */
export function agreeOnBoard<C extends Correction>(
  corrections: readonly C[],
  known: Known,
): (C | Correction)[] {
  const given = new Map(corrections.map((one) => [one.kind, one]))
  const newWays = given.get('ways')
  const code = newWays ? newWays.value : (known.get('ways')?.value ?? null)
  const ways = code === null ? null : waysOf(code)
  if (!ways) return [...corrections]

  const shownType = boardTypeOfWays(ways)
  const shownCover = rcdCoverOfWays(ways)
  const told = (kind: 'board-type' | 'rcd-cover') => given.get(kind)?.value
  const problems: FieldProblem[] = []
  const way = newWays ? 'The ways that you give' : 'The ways on record'
  const cure = newWays
    ? 'Change one of the two.'
    : 'Correct the ways too, or empty them if they are not known.'
  const type = told('board-type')
  if (knows(type) && shownType !== 'unknown' && type !== shownType)
    problems.push({
      field: 'board-type',
      problem: `${way} (${waysInWords(ways)}) make this board “${BOARD_TYPE_NAMES[shownType]}”, not “${BOARD_TYPE_NAMES[type as BoardType]}”. ${cure}`,
    })
  const cover = told('rcd-cover')
  if (knows(cover) && !coverAgrees(cover, shownCover))
    problems.push({
      field: 'rcd-cover',
      problem: `${way} (${waysInWords(ways)}) make the RCD cover “${RCD_COVER_NAMES[shownCover]}”, not “${RCD_COVER_NAMES[cover as RcdCover]}”. ${cure}`,
    })
  if (problems.length > 0) throw new Invalid(problems)
  if (!newWays) return [...corrections]

  const brought: Correction[] = []
  const bring = (kind: FactKind, value: string) => {
    if (!knows(given.get(kind)?.value) && known.get(kind)?.value !== value)
      brought.push({ kind, value, asOf: newWays.asOf, note: newWays.note ?? 'Follows from the ways' })
  }
  if (shownType !== 'unknown') bring('board-type', shownType)
  const onRecord = known.get('rcd-cover')?.value
  if (shownCover !== 'unknown' && !(knows(onRecord) && coverAgrees(onRecord, shownCover)))
    bring('rcd-cover', shownCover)
  const replaced = new Set(brought.map((one) => one.kind))
  return [...corrections.filter((one) => !replaced.has(one.kind)), ...brought]
}
