'use server'
import { publicAction } from '@/app/action'
import { letIn } from '@/app/let-in'
import { acceptInvitation, AcceptInvitation } from '@/lib/use-cases/people/accept-invitation'

export const accept = publicAction(AcceptInvitation, acceptInvitation, { then: (entry) => letIn(entry) })
