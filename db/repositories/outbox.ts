/** Notices waiting to be sent: written with the change that caused them, sent by the worker under a lease. */
import { now } from '@/lib/platform/clock'
import { newId } from '@/lib/platform/new-id'
import { type DeploymentScope, type WritingScope } from '@/db/connection'
import { claimNext, held, type Leased, putBack, type Queue } from './lease'

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

type Row = Leased & { recipient: string; subject: string; body_text: string; body_html: string }

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

const QUEUE: Queue = { table: 'outbox', working: 'sending' }

/** Claims the next notice that is due, or one whose sender died. */
export async function claim(
  scope: DeploymentScope,
  owner: string,
  leaseSeconds: number,
): Promise<ClaimedNotice | null> {
  const row = await claimNext<Row>(scope, QUEUE, owner, leaseSeconds)
  return (
    row && {
      organisationId: row.organisation_id,
      id: row.id,
      fence: row.fence,
      attempts: row.attempts,
      to: row.recipient,
      subject: row.subject,
      text: row.body_text,
      html: row.body_html,
    }
  )
}

/** A letter that has left, or never will, keeps no words: its links stand in for a sign-in. */
const EMPTIED = { body_text: '', body_html: '' }

/** Marks a claimed notice as sent; false where the lease was lost to another worker. */
export async function markSent(scope: DeploymentScope, notice: ClaimedNotice): Promise<boolean> {
  const sent = { state: 'sent', sent_at: now(), lease_until: null, last_error: null, ...EMPTIED }
  return (await held(scope, QUEUE, notice).update(sent)) === 1
}

/** Puts a claimed notice back for another try, or gives it up where `retryAt` is null. */
export async function markFailed(
  scope: DeploymentScope,
  notice: ClaimedNotice,
  why: string,
  retryAt: Date | null,
): Promise<void> {
  await held(scope, QUEUE, notice).update({ ...putBack(why, retryAt), ...(retryAt === null && EMPTIED) })
}
