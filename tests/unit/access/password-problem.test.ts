import { describe, expect, it } from 'vitest'
import { isCommonPassword } from '@/lib/access/is-common-password'
import { passwordProblem } from '@/lib/access/password-problem'

const person = { email: 'pat.oakshott@lets.example', name: 'Pat Oakshott' }

describe('a password that somebody chooses', () => {
  it.each([
    'kettle under tuesday',
    'correct horse battery staple',
    'Żółw-na-moście',
    'x8#kQ!zp',
    '✓✗☂☎♞♘⚡☕',
    'a long one '.repeat(20),
  ])('will do: %s', (password) => expect(passwordProblem(password, person)).toBeNull())

  it('needs 8 characters, counted as a person counts them', () => {
    expect(passwordProblem('x8#kQ!z', person)).toBe('Use 8 characters or more.')
    expect(passwordProblem('🔌🔌🔌🔌', person)).toBe('Use 8 characters or more.')
  })

  it('may be 200 characters and more, and is refused past 1,000', () => {
    const long = 'kettle under tuesday '.repeat(60)
    expect(passwordProblem(long.slice(0, 201), person)).toBeNull()
    expect(passwordProblem(long.slice(0, 1000), person)).toBeNull()
    expect(passwordProblem(long.slice(0, 1001), person)).toBe('Use 1000 characters or fewer.')
  })

  it.each(['pat.oakshott', 'Pat Oakshott', 'PATOAKSHOTT', 'pat.oakshott@lets.example'])(
    'is not one’s own name or address: %s',
    (password) =>
      expect(passwordProblem(password, person)).toBe('Use something other than your name or e-mail address.'),
  )
})

// The first seven stand in every published list of the commonest passwords (from memory); the rest are common practice.
describe('a common password', () => {
  it.each([
    ...['password', '12345678', '123456789', 'qwertyuiop', 'iloveyou', 'password1', '11111111'],
    ...[
      'P4ssw0rd!',
      'Liverpool1',
      'welcome123',
      'qwerty123',
      'letmein99',
      'Summer2026',
      '87654321',
      'abcdefgh',
      'asdfghjkl',
    ],
    ...['passwordpassword', 'abcabcabc', '01/12/2026', '19840229', '1q2w3e4r', 'Fuseward2026', 'electrician'],
  ])('is known as one: %s', (password) => expect(isCommonPassword(password)).toBe(true))

  it.each(['kettle under tuesday', 'summer-kettle-fence', 'x8#kQ!zp', '8271940563', 'oakshott-lane'])(
    'is not seen in %s',
    (password) => expect(isCommonPassword(password)).toBe(false),
  )
})
