import { type WritingScope } from '@/db/connection'
import { type Actor } from '@/lib/access/actor'
import { type Role, ROLE_NAMES } from '@/lib/access/role'
import { INVITATION_DAYS } from '@/lib/people/invitation'
import { now } from '@/lib/platform/clock'
import { newToken, tokenHash } from '@/lib/platform/secret-token'
import { sendLink } from './send-link'

/** A fresh token and the life of an invitation that begins now. */
export function freshInvitation(): { token: string; tokenHash: string; at: Date; expiresAt: Date } {
  const token = newToken()
  const at = now()
  return {
    token,
    tokenHash: tokenHash(token),
    at,
    expiresAt: new Date(at.getTime() + INVITATION_DAYS * 86_400_000),
  }
}

/** Puts the letter of an invitation in the outbox, in the transaction that stored its token. */
export const sendInvitation = (
  scope: WritingScope,
  actor: Actor,
  given: { email: string; role: Role },
  token: string,
): Promise<void> =>
  sendLink(scope, {
    to: given.email,
    kind: 'invitation',
    subject: `Join ${actor.organisationName} on Fuseward`,
    paragraphs: [
      `${actor.name} asks you to join ${actor.organisationName} on Fuseward, its register of electrical risk, as ${ROLE_NAMES[given.role].toLowerCase()}.`,
    ],
    linkText: 'Take up the invitation',
    path: '/accept-invitation',
    token,
    closing: [`The link works once, within ${INVITATION_DAYS} days.`, 'If you do not know them, do nothing.'],
  })
