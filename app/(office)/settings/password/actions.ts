'use server'
import { action } from '@/app/action'
import { currentSessionId } from '@/app/session'
import { visitor } from '@/app/visitor'
import { changePassword, ChangePassword } from '@/lib/use-cases/people/change-password'

export const change = action(
  ChangePassword,
  async (actor, input) =>
    changePassword(actor, { ...input, visitor: await visitor(), sessionId: await currentSessionId() }),
  { done: 'Changed. You are signed out everywhere else.' },
)
