import { type WritingScope } from '@/db/connection'
import * as memberships from '@/db/repositories/memberships'
import * as organisations from '@/db/repositories/organisations'
import { Conflict } from '@/lib/errors/expected'
import { type Membership } from '@/lib/people/membership'

/**
 * Makes sure that a manager stays when this person is none any more. Two managers who give up at once are taken one
 * after another: the organisation's row is held first.
 * @throws Conflict where they are the last one
 */
export async function keepAManager(scope: WritingScope, personId: string): Promise<Membership> {
  await organisations.lock(scope)
  const person = await memberships.getByPerson(scope, personId)
  if (person.role === 'manager' && (await memberships.countManagers(scope)) === 1)
    throw new Conflict('An organisation needs a compliance manager. Give somebody else that role first.')
  return person
}
