/**
 * Everything that homes with the same facts known and unknown share: the exact distribution of their likelihood
 * over what the unknown facts could be, and the shifts that explain it. What is particular to one home (the age of
 * known wiring, a dated inspection, open defects) moves the whole distribution and is added afterwards.
 */
import { type HazardAssessment, type RiskFactName, type Shift } from './assessment'
import { KNOWN_BOARD_TYPES, KNOWN_RCD_COVERS, KNOWN_WIRINGS } from './beliefs'
import { baseOf } from './base-likelihood'
import { type ShiftKey } from './method'
import { type Prepared, type PreparedHazard } from './prepare'
import { distributionOf, type StepDistribution } from './step-distribution'
import { weighUnknowns, type Weighed } from './weigh-unknowns'

/** Facts by place in their lists; -1 where not known. */
export type PatternFacts = {
  readonly eras: readonly number[]
  readonly dwelling: number
  readonly period: number
  readonly wiring: number
  readonly board: number
  readonly rcd: number
  readonly inspectionKnown: boolean
}

export type PatternHazard = {
  readonly base: HazardAssessment['base']
  readonly distribution: StepDistribution
  /** the shifts of all facts in the pattern; with the base they give the mean likelihood */
  readonly shifts: readonly Shift[]
}

export type Pattern = {
  readonly hazards: readonly PatternHazard[]
  readonly unknowns: readonly RiskFactName[]
}

const UNKNOWN_REASONS: Record<RiskFactName, string> = {
  'board-type': 'Consumer unit not known',
  'rcd-cover': 'RCD cover not known',
  wiring: 'Wiring not known',
  rewired: 'Age of wiring not known',
  built: 'Year built not known',
  'dwelling-type': 'Dwelling type not known',
  inspection: 'Last inspection not known',
}

type Unknown = {
  readonly fact: RiskFactName
  readonly weights: readonly number[]
  readonly steps: readonly number[]
}

function unknownsOf(
  hazard: PreparedHazard,
  facts: PatternFacts,
  weighed: Weighed,
  baseOneIn: number,
): Unknown[] {
  const cell = (era: number, group: number) =>
    4 * Math.log10(baseOneIn / (hazard.oneIn[era]?.[group] ?? baseOneIn))
  const mean = (weights: readonly number[], value: (i: number) => number) =>
    weights.reduce((sum, weight, i) => (weight > 0 ? sum + weight * value(i) : sum), 0)
  const unknowns: Unknown[] = []
  const add = (fact: RiskFactName, weights: readonly number[], steps: readonly number[]) =>
    unknowns.push({ fact, weights, steps })
  if (facts.board < 0) add('board-type', weighed.board, hazard.board)
  if (facts.rcd < 0) add('rcd-cover', weighed.rcd, hazard.rcd)
  if (facts.wiring < 0) add('wiring', weighed.wiring, hazard.wiring)
  if (facts.period < 0) add('rewired', weighed.period, hazard.periodAge)
  if (facts.eras.filter((weight) => weight > 0).length > 1) {
    const steps = facts.eras.map((_, era) => mean(weighed.dwelling, (group) => cell(era, group)))
    add('built', weighed.era, steps)
  }
  if (facts.dwelling < 0) {
    const steps = weighed.dwelling.map(
      (_, group) =>
        mean(weighed.era, (era) => cell(era, group) - mean(weighed.dwelling, (other) => cell(era, other))) +
        (group === 2 ? hazard.bedsit : 0),
    )
    add('dwelling-type', weighed.dwelling, steps)
  }
  if (!facts.inspectionKnown) add('inspection', weighed.inspection, hazard.inspection)
  return unknowns
}

function knownShifts(hazard: PreparedHazard, facts: PatternFacts): Shift[] {
  const shifts: Shift[] = []
  const add = (list: readonly string[], place: number, fact: 'board-type' | 'rcd-cover' | 'wiring') => {
    if (place >= 0) shifts.push(hazard.shiftOf(`${fact}/${list[place]}` as ShiftKey, fact))
  }
  add(KNOWN_BOARD_TYPES, facts.board, 'board-type')
  add(KNOWN_RCD_COVERS, facts.rcd, 'rcd-cover')
  add(KNOWN_WIRINGS, facts.wiring, 'wiring')
  if (facts.dwelling === 2) shifts.push(hazard.shiftOf('dwelling-type/bedsit', 'dwelling-type'))
  return shifts
}

/**
 * The shift of each unknown: its mean steps, and its part of what the mean of the likelihoods lies above the
 * likelihood of the mean steps, shared out by variance. So base and shifts together give the mean likelihood.
 */
function unknownShifts(
  prepared: Prepared,
  unknowns: readonly Unknown[],
  known: number,
  mean: number,
): Shift[] {
  const means = unknowns.map(({ weights, steps }) =>
    weights.reduce((sum, w, i) => sum + w * (steps[i] ?? 0), 0),
  )
  const variances = unknowns.map(({ weights, steps }, n) =>
    weights.reduce((sum, w, i) => sum + w * ((steps[i] ?? 0) - (means[n] ?? 0)) ** 2, 0),
  )
  const totalVariance = variances.reduce((sum, variance) => sum + variance, 0)
  const above = 4 * Math.log10(mean) - known - means.reduce((sum, value) => sum + value, 0)
  return unknowns.map(({ fact }, n) => ({
    fact,
    steps: (means[n] ?? 0) + (totalVariance > 0 ? (above * (variances[n] ?? 0)) / totalVariance : 0),
    reason: UNKNOWN_REASONS[fact],
    ...prepared.unknownSource,
    unknown: true,
  }))
}

/** The pattern of a set of facts, worked out in full. */
export function patternOf(prepared: Prepared, facts: PatternFacts): Pattern {
  const weighed = weighUnknowns(prepared, facts)
  let unknownNames: readonly RiskFactName[] = []
  const hazards = prepared.hazards.map((hazard): PatternHazard => {
    const base = baseOf(prepared, hazard, facts)
    const distribution = distributionOf(hazard, weighed, base.oneIn)
    const known = knownShifts(hazard, facts)
    const unknowns = unknownsOf(hazard, facts, weighed, base.oneIn)
    unknownNames = unknowns.map(({ fact }) => fact)
    const knownSteps = known.reduce((sum, { steps }) => sum + steps, 0)
    const shifts = [...known, ...unknownShifts(prepared, unknowns, knownSteps, distribution.meanFactor)]
    return { base, distribution, shifts }
  })
  return { hazards, unknowns: unknownNames }
}
