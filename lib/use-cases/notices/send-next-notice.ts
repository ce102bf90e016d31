import { deployment } from '@/db/connection'
import * as outbox from '@/db/repositories/outbox'
import { sendMail } from '@/lib/gateways/mail'
import { now } from '@/lib/platform/clock'
import { log } from '@/lib/platform/log'

const LEASE_SECONDS = 60
const MOST_ATTEMPTS = 8

/** Longer after each failure: 5 s, 15 s, 45 s and so on, an hour at most. */
const pauseAfter = (attempts: number) => Math.min(3_600_000, 5_000 * 3 ** (attempts - 1))

/**
 * Claims the next notice that is due and hands it to the mail server.
 * @returns whether there was one
 */
export async function sendNextNotice(owner: string): Promise<boolean> {
  const scope = deployment()
  const notice = await outbox.claim(scope, owner, LEASE_SECONDS)
  if (!notice) return false
  const about = { notice: notice.id, organisation: notice.organisationId, attempt: notice.attempts }
  try {
    await sendMail({
      id: notice.id,
      to: notice.to,
      subject: notice.subject,
      text: notice.text,
      html: notice.html,
    })
  } catch (thrown) {
    const why = thrown instanceof Error ? thrown.message : String(thrown)
    const giveUp = notice.attempts >= MOST_ATTEMPTS
    await outbox.markFailed(
      scope,
      notice,
      why,
      giveUp ? null : new Date(now().getTime() + pauseAfter(notice.attempts)),
    )
    log().warn({ ...about, gaveUp: giveUp, error: why }, 'notice not sent')
    return true
  }
  const mine = await outbox.markSent(scope, notice)
  log().info({ ...about, leaseKept: mine }, 'notice sent')
  return true
}
