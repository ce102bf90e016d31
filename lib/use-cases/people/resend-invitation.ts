import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as invitations from '@/db/repositories/invitations'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { NotFound } from '@/lib/errors/expected'
import { countInvitation } from './invite-person'
import { freshInvitation, sendInvitation } from './send-invitation'

export const ResendInvitation = z.object({ invitationId: z.uuid('Choose an invitation.') })

/**
 * Sends an invitation again with a new link that lives seven days; the old link ends.
 * @throws NotFound where it was answered, withdrawn, or is not this organisation's
 */
export async function resendInvitation(
  actor: Actor,
  { invitationId }: z.output<typeof ResendInvitation>,
): Promise<{ email: string }> {
  demand(actor, 'people.manage')
  await countInvitation(actor)
  const fresh = freshInvitation()
  return inTransaction(actor, async (scope) => {
    const invitation = await invitations.getUnanswered(scope, invitationId)
    if (!(await invitations.renew(scope, invitationId, fresh.tokenHash, fresh.expiresAt)))
      throw new NotFound('That invitation')
    await sendInvitation(scope, actor, invitation, fresh.token)
    const subject = { subjectKind: 'invitation', subjectId: invitationId }
    await audit.record(scope, { actorId: actor.personId, did: 'invitation.sent-again', ...subject })
    return { email: invitation.email }
  })
}
