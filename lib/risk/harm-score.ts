/** The published harm score: how likely an event is, times how badly it hurts. */

/** Percent of harm outcomes in classes I extreme, II severe, III serious, IV moderate; adds to 100. */
export type SpreadOfHarm = readonly [extreme: number, severe: number, serious: number, moderate: number]

/** @source Housing Health and Safety Rating System (England) Regulations 2005, SI 2005/3208; unchanged in 2026 */
export const CLASS_WEIGHTS: SpreadOfHarm = [10_000, 1_000, 300, 10]

/** A spread printed to one decimal may miss 100 by this much, in percent. */
const SPREAD_TOLERANCE = 0.15

/**
 * What a spread of harm weighs: the harm score at a likelihood of 1 in 1.
 * @throws RangeError where a share is below 0 or the shares do not add to 100
 * @example weightOfSpread([2.2, 10, 21.5, 66.3]) // 39113
 */
export function weightOfSpread(spread: SpreadOfHarm): number {
  const total = spread[0] + spread[1] + spread[2] + spread[3]
  if (spread.some((share) => !(share >= 0)) || Math.abs(total - 100) > SPREAD_TOLERANCE) {
    throw new RangeError(`Not a spread of harm: ${spread.join(' / ')}`)
  }
  return spread.reduce((sum, share, i) => sum + share * (CLASS_WEIGHTS[i] ?? 0), 0)
}

/**
 * The published formula: weights 10,000, 1,000, 300 and 10 times the percentages of outcomes, over L of "1 in L".
 * The result is not rounded.
 * @param oneIn likelihood of an event in the next twelve months, 1 in this many [1 upwards]
 * @throws RangeError where the likelihood is below 1, or the spread is none
 * @source SI 2005/3208 and SI 2006/1702 (W.164), regulation 6
 * @example harmScore(320, [31.6, 4.6, 21.5, 42.3]) // 1023.35...
 */
export function harmScore(oneIn: number, spread: SpreadOfHarm): number {
  if (!(oneIn >= 1)) throw new RangeError(`Not a likelihood: 1 in ${oneIn}`)
  return weightOfSpread(spread) / oneIn
}

/**
 * A score as it is shown: the nearest whole number, and "<1" below one. It is rounded for showing only.
 * @source one published score, 1,035 of 1,034.76, shows rounding rather than cutting; "<1" is printed so too
 * @example scoreInWords(1034.76) // '1,035'
 */
export function scoreInWords(score: number): string {
  return score < 1 ? '<1' : Math.round(score).toLocaleString('en-GB')
}
