import 'server-only'
import { env } from '@/lib/platform/env'

/** Where a demo's letters can be read, for its visitors; null in a live deployment, whose letters go to people. */
export function demoInbox(): string | null {
  const { FUSEWARD_DEPLOYMENT, MAIL_INBOX_URL } = env()
  return FUSEWARD_DEPLOYMENT === 'demo' ? (MAIL_INBOX_URL ?? null) : null
}
