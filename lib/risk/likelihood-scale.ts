/**
 * The published scale of likelihoods: sixteen representative points, each the fourth root of ten from the next.
 * The points and edges are printed rounded, so steps are taken by the exact root and not from row to row.
 * @source Housing Health and Safety Rating System (Wales) Regulations 2006, SI 2006/1702 (W.164), regulation 6,
 *   Table 1, for 1 in 320 and rarer; the commoner edges as printed on the axis of government worked-example
 *   sheets (2004). The points from 1 in 180 to 1 in 1 were seen in a second copy only.
 */

export type LikelihoodPoint = {
  /** representative likelihood, 1 in this many */
  readonly oneIn: number
  /** rarer edge of its range, 1 in this many; null where the range is open */
  readonly rarer: number | null
  /** commoner edge of its range, 1 in this many; null where the range is open */
  readonly commoner: number | null
  readonly confidence: 'read in source' | 'search excerpt'
}

const point = (
  rarer: number | null,
  oneIn: number,
  commoner: number | null,
  confidence: LikelihoodPoint['confidence'] = 'search excerpt',
): LikelihoodPoint => ({ oneIn, rarer, commoner, confidence })

/** Rarest first. */
export const LIKELIHOOD_SCALE: readonly LikelihoodPoint[] = [
  point(null, 5600, 4200, 'read in source'),
  point(4200, 3200, 2400, 'read in source'),
  point(2400, 1800, 1300, 'read in source'),
  point(1300, 1000, 750, 'read in source'),
  point(750, 560, 420, 'read in source'),
  point(420, 320, 240, 'read in source'),
  point(240, 180, 130),
  point(130, 100, 75),
  point(75, 56, 42),
  point(42, 32, 24),
  point(24, 18, 13),
  point(13, 10, 7.5),
  point(7.5, 6, 4),
  point(4, 3, 2.5),
  point(2.5, 2, 1.5),
  point(1.5, 1, null),
]

/** One step of the scale, as a factor of the likelihood: the fourth root of ten, about 1.778. */
export const STEP_FACTOR = 10 ** 0.25

export const COMMONEST_ONE_IN = 1
export const RAREST_POINT_ONE_IN = 5600

/**
 * The representative point of the range that a likelihood falls in. Which range an exact edge belongs to is not
 * printed anywhere that was found: it is given to the likelier one, the cautious reading.
 * @param oneIn likelihood, 1 in this many [above 0]
 * @throws RangeError where it is not a number above 0
 * @example scalePointOf(400) // 320
 * @example scalePointOf(19869) // 5600
 */
export function scalePointOf(oneIn: number): number {
  if (!(oneIn > 0)) throw new RangeError(`Not a likelihood: 1 in ${oneIn}`)
  const found = LIKELIHOOD_SCALE.find(({ commoner }) => commoner === null || oneIn > commoner)
  return found?.oneIn ?? COMMONEST_ONE_IN
}

/**
 * A likelihood moved along the scale. One step is one scale point; a part of a step moves by that part on the
 * logarithmic axis, so that scores rank more finely than sixteen points would.
 *
 * A likelihood on the scale stays on it, from 1 in 1 to 1 in 5,600. The scale's last range is open at its rare
 * end, and some national averages lie far out in it (1 in 19,869): such a start is not first moved to 1 in 5,600,
 * for then the average home would score three times the average; it is stepped by the same factor from where it
 * is, either way, and only the common end cuts it.
 * @param oneIn likelihood to start from, 1 in this many [1 upwards]
 * @param steps above 0 is likelier
 * @throws RangeError where either is not a finite number or the start is below 1
 * @example moveAlong(1000, 2) // 316.2...
 * @example moveAlong(19869, 4) // 1986.9
 */
export function moveAlong(oneIn: number, steps: number): number {
  if (!Number.isFinite(oneIn) || oneIn < COMMONEST_ONE_IN)
    throw new RangeError(`Not a likelihood: 1 in ${oneIn}`)
  if (!Number.isFinite(steps)) throw new RangeError(`Not a number of steps: ${steps}`)
  const moved = Math.max(COMMONEST_ONE_IN, oneIn / 10 ** (steps / 4))
  return oneIn > RAREST_POINT_ONE_IN ? moved : Math.min(RAREST_POINT_ONE_IN, moved)
}

/**
 * How many steps lie between two likelihoods; above 0 where the second is likelier.
 * @example stepsBetween(1000, 100) // 4
 */
export const stepsBetween = (fromOneIn: number, toOneIn: number): number =>
  4 * Math.log10(fromOneIn / toOneIn)
