/**
 * How often a password may be tried, so that guessing is slow and nobody can lock anybody else out.
 *
 * - A device on which the address was signed in before (its cookie says so) is counted by itself and by nothing else:
 *   whatever strangers do to the address, or on the same network, its owner goes on undisturbed.
 * - A stranger's tries are counted by network address and e-mail address together, and by network address alone; past
 *   the limit they are refused. That refuses that network, not that person.
 * - By e-mail address alone nothing is ever refused: past the limit each further try of a stranger takes longer.
 *   So tries spread over many networks are slow, and the owner on a new device waits some seconds at worst.
 * - Whoever is refused all the same (a new device behind an attacker's network) still has the link by e-mail, which
 *   these limits do not touch, and which makes the device a known one.
 *
 * Tries are counted before the password is looked at, so that many at once do not slip through, and taken back when it
 * was right. The figures are judgement.
 */
import { deployment } from '@/db/connection'
import * as rateLimits from '@/db/repositories/rate-limits'
import { Conflict } from '@/lib/errors/expected'
import { knownDevice } from './device-token'
import { type Visitor } from './visitor'

const QUARTER = 15 * 60
const HOUR = 60 * 60

export const DEVICE: rateLimits.Limit = { name: 'device', times: 10, seconds: QUARTER }
export const PAIR: rateLimits.Limit = { name: 'pair', times: 10, seconds: QUARTER }
export const NETWORK: rateLimits.Limit = { name: 'network', times: 100, seconds: HOUR }
export const ADDRESS: rateLimits.Limit = { name: 'address', times: 20, seconds: HOUR }

/** The longest that a try is held back [s] */
const LONGEST_PAUSE = 4

/** How long a stranger's try is held back, by how many there were for the address in the hour [s]. */
export const pauseAfter = (taken: number): number =>
  Math.max(0, Math.min(LONGEST_PAUSE, (taken - ADDRESS.times) / 5))

const pause = (seconds: number) => new Promise((resolve) => setTimeout(resolve, seconds * 1000))

const tooMany = (seconds: number) => {
  const minutes = Math.max(1, Math.ceil(seconds / 60))
  return new Conflict(
    `There were too many tries from here. Wait ${minutes} ${minutes === 1 ? 'minute' : 'minutes'}, or use “Forgotten password”.`,
  )
}

/**
 * Counts one try; the answer takes it back once the password turned out right.
 * @throws Conflict where there were too many
 */
export async function countTry(visitor: Visitor, email: string): Promise<() => Promise<void>> {
  const scope = deployment()
  const device = knownDevice(visitor.device, email)
  if (device) {
    const own = await rateLimits.take(scope, DEVICE, `${device} ${email}`)
    if (!own.allowed) throw tooMany(own.waitSeconds)
    return () => rateLimits.forget(scope, DEVICE, `${device} ${email}`)
  }
  const network = await rateLimits.take(scope, NETWORK, visitor.ip)
  if (!network.allowed) throw tooMany(network.waitSeconds)
  const pair = await rateLimits.take(scope, PAIR, `${visitor.ip} ${email}`)
  if (!pair.allowed) throw tooMany(pair.waitSeconds)
  await pause(pauseAfter((await rateLimits.take(scope, ADDRESS, email)).taken))
  return async () => {
    await rateLimits.forget(scope, PAIR, `${visitor.ip} ${email}`)
    await rateLimits.giveBack(scope, NETWORK, visitor.ip)
    await rateLimits.giveBack(scope, ADDRESS, email)
  }
}
