/** The exact distribution of a likelihood over everything that unknown facts could be, by full enumeration. */
import { type PreparedHazard } from './prepare'
import { type Weighed } from './weigh-unknowns'

/** Points of the distribution, rarest first; factors are of the base likelihood. */
export type StepDistribution = {
  readonly factors: Float64Array
  readonly weights: Float64Array
  readonly meanFactor: number
  readonly lowFactor: number
  readonly highFactor: number
  readonly mostFactor: number
}

/** Steps are gathered in hundredths, the finest that a shift table holds, so that equal sums meet exactly. */
const PER_STEP = 100
const LOW_POINT = 0.05
const HIGH_POINT = 0.95
/** A cumulative sum of shares may miss its point by rounding. */
const ROUNDING = 1e-12

type Sums = Map<number, number>

const place = (steps: number): number => Math.round(steps * PER_STEP)
const gather = (sums: Sums, at: number, weight: number) => {
  if (weight > 0) sums.set(at, (sums.get(at) ?? 0) + weight)
}

function convolve(one: Sums, other: Sums): Sums {
  const sums: Sums = new Map()
  for (const [a, weightA] of one) for (const [b, weightB] of other) gather(sums, a + b, weightA * weightB)
  return sums
}

function housePart(hazard: PreparedHazard, weighed: Weighed, period: number, baseOneIn: number): Sums {
  const sums: Sums = new Map()
  weighed.eraInPeriod[period]?.forEach((eraWeight, era) => {
    if (eraWeight <= 0) return
    weighed.dwelling.forEach((share, group) => {
      const average = 4 * Math.log10(baseOneIn / (hazard.oneIn[era]?.[group] ?? baseOneIn))
      gather(sums, place(average + (group === 2 ? hazard.bedsit : 0)), eraWeight * share)
    })
  })
  return sums
}

function wiringPart(hazard: PreparedHazard, weighed: Weighed, period: number): Sums {
  const sums: Sums = new Map()
  const age = weighed.isPeriodKnown ? 0 : (hazard.periodAge[period] ?? 0)
  weighed.wiringInPeriod[period]?.forEach((weight, i) =>
    gather(sums, place(age + (hazard.wiring[i] ?? 0)), weight),
  )
  return sums
}

function protectionPart(hazard: PreparedHazard, weighed: Weighed, period: number): Sums {
  const sums: Sums = new Map()
  weighed.protectionInPeriod[period]?.forEach((row, board) =>
    row.forEach((weight, rcd) =>
      gather(sums, place((hazard.board[board] ?? 0) + (hazard.rcd[rcd] ?? 0)), weight),
    ),
  )
  return sums
}

/** The distribution of one hazard's steps from its base. */
export function distributionOf(
  hazard: PreparedHazard,
  weighed: Weighed,
  baseOneIn: number,
): StepDistribution {
  let sums: Sums = new Map()
  weighed.period.forEach((periodWeight, period) => {
    if (periodWeight <= 0) return
    const house = housePart(hazard, weighed, period, baseOneIn)
    const installation = convolve(
      wiringPart(hazard, weighed, period),
      protectionPart(hazard, weighed, period),
    )
    for (const [at, weight] of convolve(house, installation)) gather(sums, at, weight)
  })
  if (weighed.inspection.length > 0) {
    const inspection: Sums = new Map()
    weighed.inspection.forEach((share, i) => gather(inspection, place(hazard.inspection[i] ?? 0), share))
    sums = convolve(sums, inspection)
  }
  const points = [...sums].sort(([a], [b]) => a - b)
  const factors = Float64Array.from(points, ([at]) => 10 ** (at / PER_STEP / 4))
  const weights = Float64Array.from(points, ([, weight]) => weight)
  let gone = 0
  let meanFactor = 0
  let lowFactor = Number.NaN
  let highFactor = Number.NaN
  points.forEach(([, weight], i) => {
    const factor = factors[i] as number
    gone += weight
    meanFactor += weight * factor
    if (Number.isNaN(lowFactor) && gone >= LOW_POINT - ROUNDING) lowFactor = factor
    if (Number.isNaN(highFactor) && gone >= HIGH_POINT - ROUNDING) highFactor = factor
  })
  return { factors, weights, meanFactor, lowFactor, highFactor, mostFactor: factors.at(-1) as number }
}
