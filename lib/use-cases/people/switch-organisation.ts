import { z } from 'zod'
import { inDeploymentTransaction } from '@/db/connection'
import * as memberships from '@/db/repositories/memberships'
import * as sessions from '@/db/repositories/sessions'
import { type Actor } from '@/lib/access/actor'
import { NotFound } from '@/lib/errors/expected'
import { now } from '@/lib/platform/clock'
import { sessionEnd } from './session-life'

export const SwitchOrganisation = z.object({ organisationId: z.uuid('Choose an organisation.') })

/** The edge adds the session that is left. */
type SwitchOrganisation = z.infer<typeof SwitchOrganisation> & { sessionId: string }

/**
 * Goes over to another organisation that gives this person access: a new session takes the place of the old one, and
 * ends when that would have ended at the latest.
 * @throws NotFound where it does not, or is not there
 */
export async function switchOrganisation(
  actor: Actor,
  input: SwitchOrganisation,
): Promise<{ sessionId: string }> {
  return inDeploymentTransaction(async (scope) => {
    const choices = await memberships.listOfPerson(scope, actor.personId)
    if (!choices.some((one) => one.organisationId === input.organisationId))
      throw new NotFound('That organisation')
    const at = now()
    const createdAt = await sessions.findBeginning(scope, input.sessionId, at)
    if (!createdAt) throw new NotFound('That session')
    await sessions.end(scope, input.sessionId, at)
    const next = { personId: actor.personId, organisationId: input.organisationId }
    return {
      sessionId: await sessions.insert(scope, { ...next, createdAt, expiresAt: sessionEnd(createdAt, at) }),
    }
  })
}
