import { z } from 'zod'
import { deployment, type DeploymentScope, inDeploymentTransaction } from '@/db/connection'
import { isDuplicate } from '@/db/duplicate'
import * as audit from '@/db/repositories/audit'
import * as invitations from '@/db/repositories/invitations'
import * as memberships from '@/db/repositories/memberships'
import * as people from '@/db/repositories/people'
import { passwordProblem } from '@/lib/access/password-problem'
import { linkToken, personName, typedPassword } from '@/lib/access/sign-in-fields'
import { Conflict, type FieldProblem, Invalid, NotFound } from '@/lib/errors/expected'
import { hashPassword, passwordMatches } from '@/lib/gateways/password'
import { now } from '@/lib/platform/clock'
import { tokenHash } from '@/lib/platform/secret-token'
import { beginSession, type LetIn } from './begin-session'
import { deviceWith } from './device-token'
import { countTry } from './sign-in-limits'
import { type Visitor } from './visitor'

export const AcceptInvitation = z.object({
  token: linkToken,
  name: z.string().optional(),
  password: typedPassword,
})
type AcceptInvitation = z.output<typeof AcceptInvitation>

/**
 * Takes an invitation up, once. An address that has a password proves itself with it; any other gets its name and its
 * password here. Either way the visitor is signed in for the organisation.
 * @throws NotFound where the link was used, withdrawn or ran out; Invalid where a field will not do
 */
export async function acceptInvitation(visitor: Visitor, input: AcceptInvitation): Promise<LetIn> {
  const invitation = await invitations.findByToken(deployment(), tokenHash(input.token), now())
  if (!invitation) throw new NotFound('That invitation')
  const person = await people.findByEmail(deployment(), invitation.email)
  const join = person?.passwordHash
    ? await provedPerson(visitor, person, input.password)
    : await newPerson(person, invitation.email, input)

  return inDeploymentTransaction(async (scope) => {
    const within = scope.within(invitation.organisationId)
    if (!(await invitations.accept(within, invitation.id, now()))) throw new NotFound('That invitation')
    const personId = await join(scope)
    await memberships.grant(within, personId, invitation)
    await audit.record(within, {
      actorId: personId,
      did: 'invitation.accepted',
      subjectKind: 'invitation',
      subjectId: invitation.id,
      detail: { personId, role: invitation.role, patches: invitation.patches },
    })
    const sessionId = await beginSession(scope, personId, invitation.organisationId)
    return { sessionId, personId, device: deviceWith(visitor.device, invitation.email) }
  })
}

const MEANWHILE = 'This address got an account meanwhile. Open the invitation again.'

function refuseDuplicate(thrown: unknown): never {
  throw isDuplicate(thrown) ? new Conflict(MEANWHILE) : thrown
}

type Join = (scope: DeploymentScope) => Promise<string>

async function provedPerson(visitor: Visitor, person: people.Person, password: string): Promise<Join> {
  const takeBack = await countTry(visitor, person.email)
  if (!(await passwordMatches(person.passwordHash, password)))
    throw new Invalid([{ field: 'password', problem: 'That is not the password of your account.' }])
  await takeBack()
  return async () => person.id
}

async function newPerson(known: people.Person | null, email: string, input: AcceptInvitation): Promise<Join> {
  const problems: FieldProblem[] = []
  const name = personName.safeParse(input.name)
  if (!name.success)
    problems.push({ field: 'name', problem: name.error.issues[0]?.message ?? 'Enter your name.' })
  const weak = passwordProblem(input.password, { email, name: name.data ?? '' })
  if (weak) problems.push({ field: 'password', problem: weak })
  if (!name.success || weak) throw new Invalid(problems)
  const passwordHash = await hashPassword(input.password)
  return async (scope) => {
    if (!known) return people.insert(scope, { email, name: name.data, passwordHash }).catch(refuseDuplicate)
    const held = await people.holdById(scope, known.id)
    if (held?.passwordHash) throw new Conflict(MEANWHILE)
    await people.setPassword(scope, known.id, passwordHash, name.data)
    return known.id
  }
}
