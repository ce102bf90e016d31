/** How often something may be tried: counted in the database, so that every web process counts together. */
import { createHash } from 'node:crypto'
import { type Knex } from 'knex'
import { RateLimiterMySQL, RateLimiterRes } from 'rate-limiter-flexible'
import { type DeploymentScope } from '@/db/connection'
import { retrying } from '@/db/retrying'
import { env } from '@/lib/platform/env'

/** So many times in so many seconds, counted from the first. */
export type Limit = { readonly name: string; readonly times: number; readonly seconds: number }

/** `taken` counts this one too; `waitSeconds` is how long until counting begins anew. */
export type Taken = { readonly allowed: boolean; readonly taken: number; readonly waitSeconds: number }

const limiters = new WeakMap<Knex, Map<string, RateLimiterMySQL>>()

function limiterOf({ db }: DeploymentScope, limit: Limit): RateLimiterMySQL {
  const known = limiters.get(db) ?? new Map<string, RateLimiterMySQL>()
  limiters.set(db, known)
  const id = `${limit.name}/${limit.times}/${limit.seconds}`
  const limiter =
    known.get(id) ??
    new RateLimiterMySQL({
      storeClient: db,
      storeType: 'knex',
      dbName: decodeURIComponent(new URL(env().DATABASE_URL).pathname.slice(1)),
      tableName: 'rate_limits',
      tableCreated: true,
      keyPrefix: limit.name,
      points: limit.times,
      duration: limit.seconds,
    })
  known.set(id, limiter)
  return limiter
}

/** The table holds no address of a person or a network, only the hash of one. */
const hashed = (key: string) => createHash('sha256').update(key).digest('hex')

const toTaken = (result: RateLimiterRes, allowed: boolean): Taken => ({
  allowed,
  taken: result.consumedPoints,
  waitSeconds: Math.ceil(result.msBeforeNext / 1000),
})

/** Counts one more try, and says whether it is still allowed. */
export async function take(scope: DeploymentScope, limit: Limit, key: string): Promise<Taken> {
  try {
    return toTaken(await retrying(() => limiterOf(scope, limit).consume(hashed(key))), true)
  } catch (thrown) {
    if (thrown instanceof RateLimiterRes) return toTaken(thrown, false)
    throw thrown
  }
}

/** Takes one try back: it turned out to be a rightful one. */
export async function giveBack(scope: DeploymentScope, limit: Limit, key: string): Promise<void> {
  await retrying(() => limiterOf(scope, limit).reward(hashed(key)))
}

/** Forgets every try under a key. */
export async function forget(scope: DeploymentScope, limit: Limit, key: string): Promise<void> {
  await retrying(() => limiterOf(scope, limit).delete(hashed(key)))
}
