/** Notices waiting to be sent: written with the change that caused them, sent by the worker under a lease. */
import { now } from '@/lib/platform/clock'
import { newId } from '@/lib/platform/new-id'
import { type DeploymentScope, type WritingScope } from '@/db/connection'

export type Notice = {
  /** one key, one notice: enqueueing it again does nothing */
  businessKey: string
  to: string
  subject: string
  text: string
  html: string
  dueAt?: Date
}

export type ClaimedNotice = {
  organisationId: string
  id: string
  fence: number
  attempts: number
  to: string
  subject: string
  text: string
  html: string
}

type Row = {
  organisation_id: string
  id: string
  fence: number
  attempts: number
  recipient: string
  subject: string
  body_text: string
  body_html: string
}

/** Puts a notice in the outbox, in the transaction of the change that caused it. */
export async function enqueue(scope: WritingScope, notice: Notice): Promise<void> {
  await scope
    .db('outbox')
    .insert({
      organisation_id: scope.organisationId,
      id: newId(),
      channel: 'email',
      business_key: notice.businessKey,
      recipient: notice.to,
      subject: notice.subject,
      body_text: notice.text,
      body_html: notice.html,
      due_at: notice.dueAt ?? now(),
    })
    .onConflict()
    .ignore()
}

/** Claims the next notice that is due, or one whose sender died: a conditional update that commits before any sending. */
export async function claim(
  scope: DeploymentScope,
  owner: string,
  leaseSeconds: number,
): Promise<ClaimedNotice | null> {
  const at = now()
  const candidates = (await scope
    .db('outbox')
    .whereIn('state', ['waiting', 'sending'])
    .andWhere('due_at', '<=', at)
    .andWhere((either) => either.where('state', 'waiting').orWhere('lease_until', '<', at))
    .orderBy(['due_at', 'id'])
    .limit(10)) as Row[]
  for (const row of candidates) {
    const claimed = await scope
      .db('outbox')
      .where({ organisation_id: row.organisation_id, id: row.id, fence: row.fence })
      .whereIn('state', ['waiting', 'sending'])
      .update({
        state: 'sending',
        lease_owner: owner,
        lease_until: new Date(at.getTime() + leaseSeconds * 1000),
        fence: Number(row.fence) + 1,
        attempts: row.attempts + 1,
      })
    if (claimed === 1)
      return {
        organisationId: row.organisation_id,
        id: row.id,
        fence: Number(row.fence) + 1,
        attempts: row.attempts + 1,
        to: row.recipient,
        subject: row.subject,
        text: row.body_text,
        html: row.body_html,
      }
  }
  return null
}

const held = (scope: DeploymentScope, notice: ClaimedNotice) =>
  scope.db('outbox').where({ organisation_id: notice.organisationId, id: notice.id, fence: notice.fence })

/** A letter that has left, or never will, keeps no words: its links stand in for a sign-in. */
const EMPTIED = { body_text: '', body_html: '' }

/** Marks a claimed notice as sent; false where the lease was lost to another worker. */
export async function markSent(scope: DeploymentScope, notice: ClaimedNotice): Promise<boolean> {
  return (
    (await held(scope, notice).update({
      state: 'sent',
      sent_at: now(),
      lease_until: null,
      last_error: null,
      ...EMPTIED,
    })) === 1
  )
}

/** Puts a claimed notice back for another try, or gives it up where `retryAt` is null. */
export async function markFailed(
  scope: DeploymentScope,
  notice: ClaimedNotice,
  why: string,
  retryAt: Date | null,
): Promise<void> {
  await held(scope, notice).update({
    state: retryAt ? 'waiting' : 'dead',
    due_at: retryAt ?? now(),
    lease_until: null,
    last_error: why.slice(0, 500),
    ...(retryAt === null && EMPTIED),
  })
}
