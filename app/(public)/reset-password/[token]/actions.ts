'use server'
import { publicAction } from '@/app/action'
import { letIn } from '@/app/let-in'
import { resetPassword, ResetPassword } from '@/lib/use-cases/people/reset-password'

export const choosePassword = publicAction(ResetPassword, resetPassword, { then: (entry) => letIn(entry) })
