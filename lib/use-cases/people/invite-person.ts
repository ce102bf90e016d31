import { z } from 'zod'
import { deployment, inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as invitations from '@/db/repositories/invitations'
import * as memberships from '@/db/repositories/memberships'
import * as organisations from '@/db/repositories/organisations'
import * as rateLimits from '@/db/repositories/rate-limits'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { emailAddress } from '@/lib/access/sign-in-fields'
import { Conflict, Invalid } from '@/lib/errors/expected'
import { chosenReach, patchIds, role } from './access-fields'
import { freshInvitation, sendInvitation } from './send-invitation'

export const InvitePerson = z.object({ email: emailAddress, role, patchIds })

/** How many invitations one organisation may send in a day, the first and the repeated ones. Judgement. */
const INVITATIONS: rateLimits.Limit = { name: 'invitations', times: 200, seconds: 24 * 60 * 60 }

/** Counts one invitation of an organisation. @throws Conflict where it has sent too many */
export async function countInvitation(actor: Actor): Promise<void> {
  const { allowed } = await rateLimits.take(deployment(), INVITATIONS, actor.organisationId)
  if (!allowed) throw new Conflict('Your organisation has sent very many invitations today. Go on tomorrow.')
}

/**
 * Asks somebody to join, by a letter to their address with a link that lives seven days.
 * @throws Invalid where they have access or an invitation already
 */
export async function invitePerson(
  actor: Actor,
  input: z.output<typeof InvitePerson>,
): Promise<{ email: string }> {
  demand(actor, 'people.manage')
  await countInvitation(actor)
  const fresh = freshInvitation()
  await inTransaction(actor, async (scope) => {
    await organisations.lock(scope)
    if (await memberships.hasEmail(scope, input.email))
      throw new Invalid([{ field: 'email', problem: 'That address has access already.' }])
    if (await invitations.hasUnanswered(scope, input.email))
      throw new Invalid([
        {
          field: 'email',
          problem: 'That address has an invitation already. Send it again from the list below.',
        },
      ])
    const patches = await chosenReach(scope, input)
    const given = { email: input.email, role: input.role, patches, invitedBy: actor.personId }
    const id = await invitations.insert(scope, { ...given, ...fresh })
    await sendInvitation(scope, actor, given, fresh.token)
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'invitation.sent',
      subjectKind: 'invitation',
      subjectId: id,
      detail: { role: input.role, patches },
    })
  })
  return { email: input.email }
}
