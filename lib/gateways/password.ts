/** Passwords are stored as argon2id hashes. */
import { type Algorithm, hash, verify } from '@node-rs/argon2'

/**
 * Memory [KiB], passes and lanes.
 * @source OWASP Password Storage Cheat Sheet, argon2id: "19 MiB of memory, an iteration count of 2, and 1 degree of
 * parallelism" (from memory)
 */
const COST = {
  algorithm: 2 satisfies Algorithm.Argon2id,
  memoryCost: 19_456,
  timeCost: 2,
  parallelism: 1,
} as const

/** The same password typed on another keyboard or system is the same text. */
const asTyped = (password: string): string => password.normalize('NFKC')

/** What is stored of a password: the hash with its salt and its cost, as one text. */
export const hashPassword = (password: string): Promise<string> => hash(asTyped(password), COST)

let nobodys: Promise<string> | undefined

/**
 * Whether a password belongs to a stored hash. Where there is no hash, the same work is done against nobody's hash, so
 * that the time it takes does not tell whether an address is known.
 */
export async function passwordMatches(stored: string | null, password: string): Promise<boolean> {
  const against = stored ?? (await (nobodys ??= hashPassword(crypto.randomUUID())))
  const matches = await verify(against, asTyped(password)).catch(() => false)
  return stored !== null && matches
}
