import { deployment } from '@/db/connection'
import * as sessions from '@/db/repositories/sessions'
import { now } from '@/lib/platform/clock'

/** Ends a session on the server: whoever holds its cookie is signed out with the next request. */
export async function endSession(sessionId: string): Promise<void> {
  await sessions.end(deployment(), sessionId, now())
}
