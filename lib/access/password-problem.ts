import { isCommonPassword } from './is-common-password'

/** The fewest characters of a password. @source NIST SP 800-63B, 5.1.1.2: at least 8 (from memory) */
export const PASSWORD_MINIMUM = 8
/** The most; far above any passphrase, and low enough that hashing stays cheap. Judgement. */
export const PASSWORD_MAXIMUM = 1_000

const folded = (text: string) => text.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '')

/**
 * What is wrong with a password somebody chooses, in words for them; null where it will do. No mixture of kinds of
 * character is asked for, and none is ever made to run out.
 * @source NIST SP 800-63B, 5.1.1.2: length, a list of common ones and no composition rules (from memory)
 * @example passwordProblem('short', { email: 'pat@lets.example', name: 'Pat' }) // 'Use 8 characters or more.'
 */
export function passwordProblem(password: string, person: { email: string; name: string }): string | null {
  const length = [...password].length
  if (length < PASSWORD_MINIMUM) return `Use ${PASSWORD_MINIMUM} characters or more.`
  if (length > PASSWORD_MAXIMUM) return `Use ${PASSWORD_MAXIMUM} characters or fewer.`
  const own = [person.email, person.email.split('@')[0] ?? '', person.name].map(folded).filter(Boolean)
  if (own.includes(folded(password))) return 'Use something other than your name or e-mail address.'
  if (isCommonPassword(password))
    return 'That password is one of those tried first. Three or four unrelated words make a good one.'
  return null
}
