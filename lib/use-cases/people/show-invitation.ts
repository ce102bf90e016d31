import { deployment } from '@/db/connection'
import * as invitations from '@/db/repositories/invitations'
import * as people from '@/db/repositories/people'
import { type Role } from '@/lib/access/role'
import { now } from '@/lib/platform/clock'
import { tokenHash } from '@/lib/platform/secret-token'

export type ShownInvitation = {
  readonly email: string
  readonly role: Role
  readonly organisationName: string
  /** whether the address has a password already: then that one is asked for, and no new one */
  readonly hasPassword: boolean
}

/** What the page behind an invitation's link shows; null where it was taken up, withdrawn, ran out or never was. */
export async function showInvitation(token: string): Promise<ShownInvitation | null> {
  const invitation = await invitations.findByToken(deployment(), tokenHash(token), now())
  if (!invitation) return null
  const { email, role, organisationName } = invitation
  const person = await people.findByEmail(deployment(), email)
  return { email, role, organisationName, hasPassword: Boolean(person?.passwordHash) }
}
