import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as memberships from '@/db/repositories/memberships'
import * as sessions from '@/db/repositories/sessions'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { now } from '@/lib/platform/clock'
import { keepAManager } from './last-manager'

export const EndAccess = z.object({ personId: z.uuid('Choose a person.') })

/**
 * Ends somebody's access to the organisation and their sessions in it, at once. What they did stays on record.
 * @throws NotFound where they have no access here, Conflict where the last manager would be gone
 */
export async function endAccess(actor: Actor, { personId }: z.output<typeof EndAccess>): Promise<void> {
  demand(actor, 'people.manage')
  await inTransaction(actor, async (scope) => {
    const { role } = await keepAManager(scope, personId)
    const at = now()
    await memberships.end(scope, personId, at)
    const ended = await sessions.endAllOf(scope, personId, at, { organisationId: actor.organisationId })
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'person.access-ended',
      subjectKind: 'person',
      subjectId: personId,
      detail: { role, sessionsEnded: ended },
    })
  })
}
