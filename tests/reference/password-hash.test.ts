import { expect, it } from 'vitest'
import { hashPassword, passwordMatches } from '@/lib/gateways/password'

/**
 * The argon2id test vector of the reference implementation (P-H-C/phc-winner-argon2, src/test.c: version 0x13, t=2,
 * m=2^16, p=1, "password", "somesalt"), from memory; the hash in it is what makes it a check and no opinion.
 */
const VECTOR = '$argon2id$v=19$m=65536,t=2,p=1$c29tZXNhbHQ$CTFhFdXPJO1aFaMaO6Mm5c8y7cJHAph8ArZWb2GRPPc'

it('reads a hash that the reference implementation made', async () => {
  expect(await passwordMatches(VECTOR, 'password')).toBe(true)
  expect(await passwordMatches(VECTOR, 'differentpassword')).toBe(false)
})

// OWASP Password Storage Cheat Sheet: argon2id with m=19456 (19 MiB), t=2, p=1 (from memory)
it('makes hashes of the recommended cost, each with its own salt', async () => {
  const [one, other] = await Promise.all([
    hashPassword('kettle under tuesday'),
    hashPassword('kettle under tuesday'),
  ])
  expect(one).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
  expect(other).not.toBe(one)
  expect(await passwordMatches(one, 'kettle under tuesday')).toBe(true)
})

it('takes the same text typed on another system as the same (Unicode NFKC)', async () =>
  expect(await passwordMatches(await hashPassword('caf\u00e9 kettle'), 'cafe\u0301 kettle')).toBe(true))

it('matches nothing where there is no hash', async () =>
  expect(await passwordMatches(null, 'password')).toBe(false))
