/** The ring round a marker says how high a score is, beside the words of the legend. */

export const SCORE_RINGS = ['double', 'single', 'none'] as const
export type ScoreRing = (typeof SCORE_RINGS)[number]

/** @source 1,000: category 1 of the published method, in every edition; 100: England's Medium of June 2026 */
const FROM: Record<ScoreRing, number> = { double: 1_000, single: 100, none: 0 }

export const SCORE_RING_WORDS: Record<ScoreRing, string> = {
  double: 'Two rings: score 1,000 or more, category 1',
  single: 'One ring: score 100 to 999',
  none: 'No ring: score under 100',
}

/**
 * The ring of a score, unrounded.
 * @example ringOf(1_034.8) // 'double'
 * @example ringOf(99.9) // 'none'
 */
export const ringOf = (score: number): ScoreRing => SCORE_RINGS.find((ring) => score >= FROM[ring]) ?? 'none'
