/** How a row of a queue is claimed: a conditional update that commits before any work, under a lease with a fencing token. */
import { now } from '@/lib/platform/clock'
import { type DeploymentScope } from '@/db/connection'

/** A queue: its table, and what the state of a row is called while somebody works on it. */
export type Queue = { readonly table: 'jobs' | 'outbox'; readonly working: 'running' | 'sending' }

/** What is held by a lease. The fence rises with every claim, so a holder that was overtaken can change nothing. */
export type Leased = {
  readonly organisation_id: string
  readonly id: string
  readonly fence: number
  readonly attempts: number
}

const AT_ONCE = 10

/** When a lease of so many seconds ends. */
const leaseEnd = (from: Date, seconds: number) => new Date(from.getTime() + seconds * 1000)

/** Claims the next row that is due, or one whose holder died; null where there is none. */
export async function claimNext<Row extends Leased>(
  scope: DeploymentScope,
  { table, working }: Queue,
  owner: string,
  seconds: number,
): Promise<Row | null> {
  const at = now()
  const candidates = (await scope
    .db(table)
    .whereIn('state', ['waiting', working])
    .andWhere('due_at', '<=', at)
    .andWhere((either) => either.where('state', 'waiting').orWhere('lease_until', '<', at))
    .orderBy(['due_at', 'id'])
    .limit(AT_ONCE)) as Row[]
  for (const row of candidates) {
    const next = { fence: Number(row.fence) + 1, attempts: row.attempts + 1 }
    const claimed = await scope
      .db(table)
      .where({ organisation_id: row.organisation_id, id: row.id, fence: row.fence })
      .whereIn('state', ['waiting', working])
      .update({ state: working, lease_owner: owner, lease_until: leaseEnd(at, seconds), ...next })
    if (claimed === 1) return { ...row, ...next }
  }
  return null
}

type Held = { readonly organisationId: string; readonly id: string; readonly fence: number }

/** The row, as long as its holder still holds it. */
export const held = (scope: DeploymentScope, { table }: Queue, { organisationId, id, fence }: Held) =>
  scope.db(table).where({ organisation_id: organisationId, id, fence })

/** The columns of a lease that is lengthened. */
export const lengthened = (seconds: number) => ({ lease_until: leaseEnd(now(), seconds) })

/** The columns of a row put back for another try, or given up where `retryAt` is null. */
export const putBack = (why: string, retryAt: Date | null) => ({
  state: retryAt ? 'waiting' : 'dead',
  due_at: retryAt ?? now(),
  lease_until: null,
  last_error: why.slice(0, 500),
})
