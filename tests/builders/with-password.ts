/** Gives people a password, so that they can sign in. */
import { deployment } from '@/db/connection'
import * as people from '@/db/repositories/people'
import { type Actor } from '@/lib/access/actor'
import { hashPassword } from '@/lib/gateways/password'

export const PASSWORD = 'kettle under tuesday'

/** @example await withPassword(manager) */
export async function withPassword(actor: Actor, password = PASSWORD): Promise<Actor> {
  await people.setPassword(deployment(), actor.personId, await hashPassword(password))
  return actor
}
