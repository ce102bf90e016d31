import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as invitations from '@/db/repositories/invitations'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { NotFound } from '@/lib/errors/expected'
import { now } from '@/lib/platform/clock'

export const WithdrawInvitation = z.object({ invitationId: z.uuid('Choose an invitation.') })

/**
 * Withdraws an invitation; its link ends at once.
 * @throws NotFound where it was answered, withdrawn, or is not this organisation's
 */
export async function withdrawInvitation(
  actor: Actor,
  { invitationId }: z.output<typeof WithdrawInvitation>,
): Promise<void> {
  demand(actor, 'people.manage')
  await inTransaction(actor, async (scope) => {
    if (!(await invitations.withdraw(scope, invitationId, now()))) throw new NotFound('That invitation')
    const subject = { subjectKind: 'invitation', subjectId: invitationId }
    await audit.record(scope, { actorId: actor.personId, did: 'invitation.withdrawn', ...subject })
  })
}
