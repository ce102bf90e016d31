/** A score's explanation in words, for the screen. */
import { type Basis, type Hazard, type Shift } from './assessment'

export const HAZARD_NAMES: Record<Hazard, string> = {
  electrical: 'Electrical hazards',
  fire: 'Fire, electrical part',
}

export const BASIS_WORDS: Record<Basis, string> = { published: 'published', judgement: 'judgement' }

/** Steps nearer to none than this are said to be none. */
const SMALLEST_SHOWN = 0.05

/**
 * A likelihood in words: whole numbers, one decimal below 1 in 10.
 * @param oneIn likelihood, 1 in this many
 * @example likelihoodInWords(319.6) // '1 in 320'
 * @example likelihoodInWords(19869) // '1 in 19,869'
 * @example likelihoodInWords(7.48) // '1 in 7.5'
 */
export function likelihoodInWords(oneIn: number): string {
  const rounded = oneIn < 9.95 ? Math.round(oneIn * 10) / 10 : Math.round(oneIn)
  return `1 in ${rounded.toLocaleString('en-GB')}`
}

/**
 * How far a number of steps moves a likelihood, in words.
 * @example stepsInWords(2.25) // '2.3 steps likelier'
 * @example stepsInWords(-1) // '1 step less likely'
 * @example stepsInWords(0) // 'no change'
 */
export function stepsInWords(steps: number): string {
  if (Math.abs(steps) < SMALLEST_SHOWN) return 'no change'
  const shown = Math.round(Math.abs(steps) * 10) / 10
  return `${shown} ${shown === 1 ? 'step' : 'steps'} ${steps > 0 ? 'likelier' : 'less likely'}`
}

/**
 * A shift in words; for an unknown, that it is the mean over what the fact could be.
 * @example shiftInWords({ fact: 'rcd-cover', steps: 2.5, reason: 'No RCD', ... }) // 'No RCD: 2.5 steps likelier'
 */
export function shiftInWords({
  reason,
  steps,
  unknown,
}: Pick<Shift, 'reason' | 'steps' | 'unknown'>): string {
  return `${reason}: ${stepsInWords(steps)}${unknown ? ', the mean over what it could be' : ''}`
}
