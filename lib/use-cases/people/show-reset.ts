import { deployment } from '@/db/connection'
import * as passwordResets from '@/db/repositories/password-resets'
import * as people from '@/db/repositories/people'
import { now } from '@/lib/platform/clock'
import { tokenHash } from '@/lib/platform/secret-token'

export type ShownReset = { readonly email: string; readonly isFirst: boolean }

/** What the page behind a reset's link shows; null where the link was used, ran out or never was. */
export async function showReset(token: string): Promise<ShownReset | null> {
  const personId = await passwordResets.findPerson(deployment(), tokenHash(token), now())
  const person = personId && (await people.findById(deployment(), personId))
  return person ? { email: person.email, isFirst: person.passwordHash === null } : null
}
