'use server'
import { z } from 'zod'
import { publicAction } from '@/app/action'
import { letIn } from '@/app/let-in'
import { SignIn } from '@/lib/access/sign-in-fields'
import { signIn } from '@/lib/use-cases/people/sign-in'

export const enter = publicAction(SignIn.extend({ next: z.string().optional() }), signIn, {
  then: (entry, { next }) => letIn(entry, next),
})
