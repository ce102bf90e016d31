/** What a home's page says of what has just been done to it. The address holds the key, never the words. */
const SAID = {
  facts: 'The facts are corrected, and the score is made anew from them.',
  inspection: 'The inspection is on record. Standing and score follow from it.',
  defect: 'The defect is on record as open.',
  closed: 'The defect is closed. It stays on record with its note.',
  identity: 'The changes are saved.',
  added: 'The home is in the register.',
} as const

/**
 * The sentence for a key in the address; null where it is none.
 * @example saidOf('closed') // 'The defect is closed. It stays on record with its note.'
 */
export const saidOf = (key: string | string[] | undefined): string | null =>
  typeof key === 'string' && Object.hasOwn(SAID, key) ? SAID[key as keyof typeof SAID] : null

/** A home's page, saying what has just been done. */
export const homeSaying = (homeId: string, key: keyof typeof SAID): string => `/homes/${homeId}?said=${key}`
