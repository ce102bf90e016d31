import { deployment } from '@/db/connection'
import * as jobs from '@/db/repositories/jobs'
import { isRefusal } from '@/lib/errors/expected'
import { now, today } from '@/lib/platform/clock'
import { log } from '@/lib/platform/log'
import { type Job, type JobContext } from './job'

const LEASE_SECONDS = 60
const MOST_ATTEMPTS = 5

class LeaseLost extends Error {}

/** Longer after each failure: 5 s, 20 s, 80 s, 320 s. */
const pauseAfter = (attempts: number) => 5_000 * 4 ** (attempts - 1)

/**
 * Claims the next job that is due and runs it under its lease.
 * @returns whether there was one
 */
export async function runNextJob(owner: string, known: ReadonlyMap<string, Job>): Promise<boolean> {
  const scope = deployment()
  const claimed = await jobs.claim(scope, owner, LEASE_SECONDS)
  if (!claimed) return false
  const job = known.get(claimed.kind)
  const about = {
    job: claimed.kind,
    id: claimed.id,
    organisation: claimed.organisationId,
    attempt: claimed.attempts,
  }
  const keep = async (progress?: { done: number; total: number | null }) => {
    if (!(await jobs.keep(scope, claimed, LEASE_SECONDS, progress)))
      throw new LeaseLost('another worker has this job now')
  }
  const context: JobContext = {
    organisationId: claimed.organisationId,
    payload: claimed.payload,
    today: today(),
    progress: (done, total) => keep({ done, total }),
  }
  const heartbeat = setInterval(() => void keep().catch(() => undefined), (LEASE_SECONDS * 1000) / 3)
  const began = performance.now()
  try {
    if (!job) throw new Error(`no job is called ${claimed.kind}`)
    await job.run(context)
    await jobs.markDone(scope, claimed)
    log().info({ ...about, milliseconds: Math.round(performance.now() - began) }, 'job done')
  } catch (thrown) {
    if (thrown instanceof LeaseLost) {
      log().warn(about, 'job lease lost')
      return true
    }
    const why = thrown instanceof Error ? thrown.message : String(thrown)
    const giveUp = isRefusal(thrown) || claimed.attempts >= MOST_ATTEMPTS
    await jobs.markFailed(
      scope,
      claimed,
      why,
      giveUp ? null : new Date(now().getTime() + pauseAfter(claimed.attempts)),
    )
    if (giveUp)
      await job?.giveUp?.(
        context,
        isRefusal(thrown) ? why : 'The program failed at it several times and has stopped trying.',
      )
    log().error(
      { ...about, gaveUp: giveUp, error: why, stack: thrown instanceof Error ? thrown.stack : undefined },
      'job failed',
    )
  } finally {
    clearInterval(heartbeat)
  }
  return true
}
