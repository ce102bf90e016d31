import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as memberships from '@/db/repositories/memberships'
import * as organisations from '@/db/repositories/organisations'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { chosenReach, patchIds, role } from './access-fields'
import { keepAManager } from './last-manager'

export const ChangeAccess = z.object({ personId: z.uuid('Choose a person.'), role, patchIds })

/**
 * Changes somebody's role and patches; it holds from their next request.
 * @throws NotFound where they have no access here, Conflict where the last manager would be gone
 */
export async function changeAccess(actor: Actor, input: z.output<typeof ChangeAccess>): Promise<void> {
  demand(actor, 'people.manage')
  await inTransaction(actor, async (scope) => {
    await organisations.lock(scope)
    const reach = await chosenReach(scope, input)
    const before =
      input.role === 'manager'
        ? await memberships.getByPerson(scope, input.personId)
        : await keepAManager(scope, input.personId)
    await memberships.grant(scope, input.personId, { role: input.role, patches: reach })
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'person.access-changed',
      subjectKind: 'person',
      subjectId: input.personId,
      detail: { role: [before.role, input.role], patches: [before.patches, reach] },
    })
  })
}
