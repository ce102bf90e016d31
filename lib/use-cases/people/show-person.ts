import { reading } from '@/db/connection'
import * as memberships from '@/db/repositories/memberships'
import * as patches from '@/db/repositories/patches'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { type Membership } from '@/lib/people/membership'

export type ShownPerson = {
  readonly person: Membership
  readonly patches: readonly patches.Patch[]
  readonly isLastManager: boolean
  readonly isSelf: boolean
}

/**
 * Somebody with access, to change it.
 * @throws NotFound where they have none in this organisation
 */
export async function showPerson(actor: Actor, { personId }: { personId: string }): Promise<ShownPerson> {
  demand(actor, 'people.manage')
  const scope = reading(actor)
  const person = await memberships.getByPerson(scope, personId)
  return {
    person,
    patches: await patches.list(scope),
    isLastManager: person.role === 'manager' && (await memberships.countManagers(scope)) === 1,
    isSelf: person.personId === actor.personId,
  }
}
