import { z } from 'zod'
import { deployment, inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as people from '@/db/repositories/people'
import * as sessions from '@/db/repositories/sessions'
import { type Actor } from '@/lib/access/actor'
import { passwordProblem } from '@/lib/access/password-problem'
import { typedPassword } from '@/lib/access/sign-in-fields'
import { Invalid } from '@/lib/errors/expected'
import { hashPassword, passwordMatches } from '@/lib/gateways/password'
import { now } from '@/lib/platform/clock'
import { countTry } from './sign-in-limits'
import { type Visitor } from './visitor'

export const ChangePassword = z.object({ currentPassword: typedPassword, password: typedPassword })

/** The edge adds who is at the keyboard and which session stays. */
type ChangePassword = z.infer<typeof ChangePassword> & { visitor: Visitor; sessionId: string | null }

/**
 * Changes one's own password; every other session of the person ends. Nothing but being signed in is needed.
 * @throws Invalid where the current one is wrong or the new one will not do, Conflict where there were too many tries
 */
export async function changePassword(actor: Actor, input: ChangePassword): Promise<{ ended: number }> {
  const takeBack = await countTry(input.visitor, actor.email)
  const person = await people.findById(deployment(), actor.personId)
  if (!(await passwordMatches(person?.passwordHash ?? null, input.currentPassword)))
    throw new Invalid([{ field: 'currentPassword', problem: 'That is not your current password.' }])
  await takeBack()
  const problem = passwordProblem(input.password, actor)
  if (problem) throw new Invalid([{ field: 'password', problem }])
  const passwordHash = await hashPassword(input.password)
  return inTransaction(actor, async (scope) => {
    await people.setPassword(scope, actor.personId, passwordHash)
    const ended = await sessions.endAllOf(scope, actor.personId, now(), { except: input.sessionId })
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'person.password-changed',
      subjectKind: 'person',
      subjectId: actor.personId,
    })
    return { ended }
  })
}
