import { z } from 'zod'
import { deployment, inDeploymentTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as memberships from '@/db/repositories/memberships'
import * as passwordResets from '@/db/repositories/password-resets'
import * as people from '@/db/repositories/people'
import * as sessions from '@/db/repositories/sessions'
import { passwordProblem } from '@/lib/access/password-problem'
import { linkToken, typedPassword } from '@/lib/access/sign-in-fields'
import { Conflict, Invalid } from '@/lib/errors/expected'
import { hashPassword } from '@/lib/gateways/password'
import { now } from '@/lib/platform/clock'
import { tokenHash } from '@/lib/platform/secret-token'
import { beginSession, type LetIn } from './begin-session'
import { deviceWith } from './device-token'
import { type Visitor } from './visitor'

export const ResetPassword = z.object({ token: linkToken, password: typedPassword })

const ENDED = 'This link was used already or has run out. Ask for a new one under “Forgotten password”.'

/**
 * Sets a new password by a link, once: every session of the person ends, every other link too, and this visitor is
 * signed in.
 * @throws Conflict where the link was used or ran out, Invalid where the password will not do
 */
export async function resetPassword(visitor: Visitor, input: z.infer<typeof ResetPassword>): Promise<LetIn> {
  const hash = tokenHash(input.token)
  const personId = await passwordResets.findPerson(deployment(), hash, now())
  const person = personId === null ? null : await people.findById(deployment(), personId)
  if (!person) throw new Conflict(ENDED)
  const problem = passwordProblem(input.password, person)
  if (problem) throw new Invalid([{ field: 'password', problem }])
  const passwordHash = await hashPassword(input.password)

  return inDeploymentTransaction(async (scope) => {
    const at = now()
    if (!(await passwordResets.use(scope, hash, at))) throw new Conflict(ENDED)
    const [organisation] = await memberships.listOfPerson(scope, person.id)
    if (!organisation) throw new Conflict('No organisation gives you access any more.')
    await people.setPassword(scope, person.id, passwordHash)
    await passwordResets.endAllOf(scope, person.id, at)
    await sessions.endAllOf(scope, person.id, at)
    await audit.record(scope.within(organisation.organisationId), {
      actorId: person.id,
      did: person.passwordHash === null ? 'person.password-chosen' : 'person.password-reset',
      subjectKind: 'person',
      subjectId: person.id,
    })
    const sessionId = await beginSession(scope, person.id, organisation.organisationId)
    return { sessionId, personId: person.id, device: deviceWith(visitor.device, person.email) }
  })
}
