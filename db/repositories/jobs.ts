/** Work for the worker: queued with the change that caused it, claimed under a lease with a fencing token. */
import { now } from '@/lib/platform/clock'
import { newId } from '@/lib/platform/new-id'
import { type DeploymentScope, type Scope, type WritingScope } from '@/db/connection'
import { claimNext, held, type Leased, lengthened, putBack, type Queue } from './lease'

export type NewJob = {
  kind: string
  /** one key a kind, one job: enqueueing it again does nothing */
  businessKey: string
  payload: Record<string, unknown>
  dueAt?: Date
}

export type ClaimedJob = {
  organisationId: string
  id: string
  kind: string
  payload: Record<string, unknown>
  fence: number
  attempts: number
}

export type JobProgress = {
  state: 'waiting' | 'running' | 'done' | 'dead'
  done: number
  total: number | null
  error: string | null
}

type Row = Leased & { kind: string; payload: string }

/** Queues a job, in the transaction of the change that caused it. */
export async function enqueue(scope: WritingScope, job: NewJob): Promise<void> {
  await scope
    .db('jobs')
    .insert({
      organisation_id: scope.organisationId,
      id: newId(),
      kind: job.kind,
      business_key: job.businessKey,
      payload: JSON.stringify(job.payload),
      due_at: job.dueAt ?? now(),
    })
    .onConflict()
    .ignore()
}

const QUEUE: Queue = { table: 'jobs', working: 'running' }

/** Claims the next job that is due, or one whose worker died; null where there is none. */
export async function claim(
  scope: DeploymentScope,
  owner: string,
  leaseSeconds: number,
): Promise<ClaimedJob | null> {
  const row = await claimNext<Row>(scope, QUEUE, owner, leaseSeconds)
  return (
    row && {
      organisationId: row.organisation_id,
      id: row.id,
      kind: row.kind,
      payload: JSON.parse(row.payload) as Record<string, unknown>,
      fence: row.fence,
      attempts: row.attempts,
    }
  )
}

/** Lengthens the lease and notes progress; false where the lease was lost, and the work must stop. */
export async function keep(
  scope: DeploymentScope,
  job: ClaimedJob,
  leaseSeconds: number,
  progress?: { done: number; total: number | null },
): Promise<boolean> {
  const noted = progress && { progress_done: progress.done, progress_total: progress.total }
  return (await held(scope, QUEUE, job).update({ ...lengthened(leaseSeconds), ...noted })) === 1
}

/** Marks a claimed job as done; false where the lease was lost. */
export async function markDone(scope: DeploymentScope, job: ClaimedJob): Promise<boolean> {
  const done = { state: 'done', finished_at: now(), lease_until: null, last_error: null }
  return (await held(scope, QUEUE, job).update(done)) === 1
}

/** Puts a claimed job back for another try, or gives it up where `retryAt` is null. */
export async function markFailed(
  scope: DeploymentScope,
  job: ClaimedJob,
  why: string,
  retryAt: Date | null,
): Promise<void> {
  await held(scope, QUEUE, job).update({ ...putBack(why, retryAt), finished_at: retryAt ? null : now() })
}

/** How a job is getting on, by its kind and key. */
export async function findProgress(
  scope: Scope,
  kind: string,
  businessKey: string,
): Promise<JobProgress | null> {
  const row = (await scope
    .db('jobs')
    .where({ organisation_id: scope.organisationId, kind, business_key: businessKey })
    .first('state', 'progress_done', 'progress_total', 'last_error')) as
    | {
        state: JobProgress['state']
        progress_done: number
        progress_total: number | null
        last_error: string | null
      }
    | undefined
  return row
    ? { state: row.state, done: row.progress_done, total: row.progress_total, error: row.last_error }
    : null
}
