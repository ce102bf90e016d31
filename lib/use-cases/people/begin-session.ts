import { type DeploymentScope } from '@/db/connection'
import * as sessions from '@/db/repositories/sessions'
import { now } from '@/lib/platform/clock'
import { sessionEnd } from './session-life'

/** What the edge needs to let somebody in: the id for the cookie, and what the device's cookie becomes. */
export type LetIn = { readonly sessionId: string; readonly device: string; readonly personId: string }

/** Begins a session row for a person in an organisation, within the caller's transaction where there is one. */
export function beginSession(
  scope: DeploymentScope,
  personId: string,
  organisationId: string,
): Promise<string> {
  const at = now()
  return sessions.insert(scope, { personId, organisationId, createdAt: at, expiresAt: sessionEnd(at, at) })
}
