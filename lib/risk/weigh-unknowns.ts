/** How likely each combination of unknown facts is, given the known ones: Bayes' rule down the tree of beliefs. */
import { type PatternFacts } from './pattern'
import { type Prepared } from './prepare'

/** Weights after the known facts: singly, and the joint ones that an exact enumeration needs. */
export type Weighed = {
  readonly era: readonly number[]
  readonly period: readonly number[]
  readonly wiring: readonly number[]
  readonly board: readonly number[]
  readonly rcd: readonly number[]
  readonly dwelling: readonly number[]
  readonly inspection: readonly number[]
  /** by period, then era: adds to 1 over both */
  readonly eraInPeriod: readonly (readonly number[])[]
  /** within each period, adding to 1 */
  readonly wiringInPeriod: readonly (readonly number[])[]
  /** within each period, by board and then cover, adding to 1 */
  readonly protectionInPeriod: readonly (readonly (readonly number[])[])[]
  /** whether the wiring's age belongs to the pattern, or is known and added for each home */
  readonly isPeriodKnown: boolean
}

const total = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0)
const only = (length: number, place: number): number[] =>
  Array.from({ length }, (_, i) => (i === place ? 1 : 0))

/** A row of shares cut to a known place, and how likely that place was. */
function given(row: readonly number[], place: number): { weights: readonly number[]; likelihood: number } {
  return place < 0
    ? { weights: row, likelihood: 1 }
    : { weights: only(row.length, place), likelihood: row[place] ?? 0 }
}

function protection(prepared: Prepared, facts: PatternFacts, period: number) {
  const boards = prepared.board[period] ?? []
  const joint = boards.map((share, board) => {
    const weight = facts.board < 0 || facts.board === board ? share : 0
    return (prepared.rcd[board] ?? []).map((cover, rcd) =>
      facts.rcd < 0 || facts.rcd === rcd ? weight * cover : 0,
    )
  })
  const likelihood = total(joint.map(total))
  if (likelihood > 0) return { joint: joint.map((row) => row.map((w) => w / likelihood)), likelihood }
  // known facts that the beliefs hold impossible are still facts: each known place as it is, the rest by shares
  const { weights } = given(boards, facts.board)
  const certain = weights.map((weight, board) => {
    const row = given(prepared.rcd[board] ?? [], facts.rcd).weights
    return row.map((cover) => weight * cover)
  })
  return { joint: certain, likelihood: 0 }
}

/** The weights of everything unknown. Facts that contradict each other by the beliefs fall back to shares alone. */
export function weighUnknowns(prepared: Prepared, facts: PatternFacts): Weighed {
  const periods = prepared.wiring.map((row, period) => ({
    wiring: given(row, facts.wiring),
    protection: protection(prepared, facts, period),
  }))
  const prior = periods.map((_, period) =>
    facts.eras.map((weight, era) =>
      facts.period >= 0
        ? period === facts.period
          ? weight
          : 0
        : weight * (prepared.period[era]?.[period] ?? 0),
    ),
  )
  const informed = prior.map((row, period) => {
    const seen = periods[period]
    const likelihood = seen ? seen.wiring.likelihood * seen.protection.likelihood : 0
    return row.map((weight) => weight * likelihood)
  })
  const weight = total(informed.map(total))
  const eraInPeriod = weight > 0 ? informed.map((row) => row.map((value) => value / weight)) : prior
  const period = eraInPeriod.map(total)
  const over = (rowOf: (place: number) => readonly number[]): number[] => {
    const sums: number[] = []
    period.forEach((periodWeight, place) =>
      rowOf(place).forEach((value, i) => (sums[i] = (sums[i] ?? 0) + periodWeight * value)),
    )
    return sums
  }
  const wiringInPeriod = periods.map(({ wiring }) => wiring.weights)
  const protectionInPeriod = periods.map((place) => place.protection.joint)
  return {
    era: facts.eras.map((_, era) => total(eraInPeriod.map((row) => row[era] ?? 0))),
    period,
    wiring: over((place) => wiringInPeriod[place] ?? []),
    board: over((place) => (protectionInPeriod[place] ?? []).map(total)),
    rcd: over((place) => {
      const joint = protectionInPeriod[place] ?? []
      return (joint[0] ?? []).map((_, rcd) => total(joint.map((row) => row[rcd] ?? 0)))
    }),
    dwelling: facts.dwelling >= 0 ? only(prepared.dwelling.length, facts.dwelling) : prepared.dwelling,
    inspection: facts.inspectionKnown ? [] : prepared.inspection,
    eraInPeriod,
    wiringInPeriod,
    protectionInPeriod,
    isPeriodKnown: facts.period >= 0,
  }
}
