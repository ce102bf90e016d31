import { deployment } from '@/db/connection'
import * as sessions from '@/db/repositories/sessions'
import { type Actor } from '@/lib/access/actor'
import { now } from '@/lib/platform/clock'
import { sessionEnd } from './session-life'

/** A session's end is moved at most this often, so that reading does not mean writing [ms] */
const STEP = 10 * 60_000

const ID = /^[0-9a-f-]{36}$/

/** Who a session stands for, read afresh; null where it ended, ran out, or the access behind it ended. */
export async function readActor(sessionId: string): Promise<Actor | null> {
  if (!ID.test(sessionId)) return null
  const at = now()
  const live = await sessions.findLive(deployment(), sessionId, at)
  if (!live) return null
  const end = sessionEnd(live.createdAt, at)
  if (end.getTime() - live.expiresAt.getTime() >= STEP) await sessions.extend(deployment(), sessionId, end)
  return live.actor
}
