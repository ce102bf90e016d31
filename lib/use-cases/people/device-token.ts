/**
 * The device's cookie: a random id and, for each of the last people who signed in there, a seal of the two. It signs
 * nobody in. It only says that this browser is no stranger to an address, so that tries by strangers do not keep the
 * rightful person out (see sign-in-limits.ts).
 */
import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto'
import { env } from '@/lib/platform/env'

const PEOPLE = 5

const seal = (id: string, email: string) =>
  createHmac('sha256', env().NEXTAUTH_SECRET).update(`device\n${id}\n${email}`).digest('base64url')

const parts = (device: string | null): { id: string; seals: string[] } | null => {
  const [id, ...seals] = device?.split('.') ?? []
  return id && /^[\w-]{22}$/.test(id) ? { id, seals: seals.slice(0, PEOPLE) } : null
}

const same = (one: string, other: string) =>
  one.length === other.length && timingSafeEqual(Buffer.from(one), Buffer.from(other))

/** The device's id where the address was signed in there before, else null. */
export function knownDevice(device: string | null, email: string): string | null {
  const found = parts(device)
  if (!found) return null
  const right = seal(found.id, email)
  return found.seals.some((one) => same(one, right)) ? found.id : null
}

/** The device's cookie after an address was signed in there; the last five addresses stay. */
export function deviceWith(device: string | null, email: string): string {
  const found = parts(device) ?? { id: randomBytes(16).toString('base64url'), seals: [] }
  const added = seal(found.id, email)
  return [found.id, added, ...found.seals.filter((one) => one !== added).slice(0, PEOPLE - 1)].join('.')
}
