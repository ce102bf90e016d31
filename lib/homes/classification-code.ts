/** The codes an inspector gives an observation. They come from the inspector, never from the program. */
export const CLASSIFICATION_CODES = ['C1', 'C2', 'C3', 'FI'] as const
export type ClassificationCode = (typeof CLASSIFICATION_CODES)[number]

/** @source wording of the trade as summarised in BS 7671 Appendix 6 notes; seen in council policies */
export const CODE_MEANINGS: Record<ClassificationCode, string> = {
  C1: 'Danger present',
  C2: 'Potentially dangerous',
  C3: 'Improvement recommended',
  FI: 'Further investigation required',
}
