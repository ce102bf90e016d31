/**
 * The published scale for the share of harm outcomes in a class: eleven points. It serves classes I to III; the
 * share of class IV is what is left of 100.
 * @source guidance of the Housing Health and Safety Rating System, from memory; ten of the eleven points were seen
 *   on published worked-example sheets, 0.2 was not. Edges from 0.15 upwards agree with the rounded geometric
 *   means of their neighbours.
 */

export type OutcomePoint = {
  /** representative share, percent */
  readonly percent: number
  /** lower edge of its range, percent */
  readonly from: number
  readonly confidence: 'search excerpt' | 'from memory'
}

/** Smallest share first. */
export const OUTCOME_SCALE: readonly OutcomePoint[] = [
  { percent: 0, from: 0, confidence: 'search excerpt' },
  { percent: 0.1, from: 0.05, confidence: 'search excerpt' },
  { percent: 0.2, from: 0.15, confidence: 'from memory' },
  { percent: 0.5, from: 0.3, confidence: 'search excerpt' },
  { percent: 1, from: 0.7, confidence: 'search excerpt' },
  { percent: 2.2, from: 1.5, confidence: 'search excerpt' },
  { percent: 4.6, from: 3, confidence: 'search excerpt' },
  { percent: 10, from: 7, confidence: 'search excerpt' },
  { percent: 21.5, from: 15, confidence: 'search excerpt' },
  { percent: 31.6, from: 26, confidence: 'search excerpt' },
  { percent: 46.4, from: 38, confidence: 'search excerpt' },
]

/**
 * The representative point of the range that a share falls in; an exact edge goes to the larger point.
 * @param percent share of outcomes [0 to 100]
 * @throws RangeError outside 0 to 100
 * @example outcomePointOf(34) // 31.6
 */
export function outcomePointOf(percent: number): number {
  if (!(percent >= 0 && percent <= 100)) throw new RangeError(`Not a share: ${percent} %`)
  return OUTCOME_SCALE.findLast(({ from }) => percent >= from)?.percent ?? 0
}
