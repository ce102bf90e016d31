'use server'
import { action } from '@/app/action'
import { invitePerson, InvitePerson } from '@/lib/use-cases/people/invite-person'
import { resendInvitation, ResendInvitation } from '@/lib/use-cases/people/resend-invitation'
import { withdrawInvitation, WithdrawInvitation } from '@/lib/use-cases/people/withdraw-invitation'

export const invite = action(InvitePerson, invitePerson, {
  done: ({ email }) => `The invitation is on its way to ${email}.`,
})

export const resend = action(ResendInvitation, resendInvitation, {
  done: ({ email }) => `Sent again to ${email}. The link that was sent before works no longer.`,
})

export const withdraw = action(WithdrawInvitation, withdrawInvitation, { done: 'Withdrawn.' })
