import { deployment } from '@/db/connection'
import * as memberships from '@/db/repositories/memberships'
import * as sessions from '@/db/repositories/sessions'
import { type SignIn } from '@/lib/access/sign-in-fields'
import { NotAllowed } from '@/lib/errors/expected'
import { beginSession, type LetIn } from './begin-session'
import { checkPassword } from './check-password'
import { deviceWith } from './device-token'
import { type Visitor } from './visitor'

/**
 * Signs somebody in, for the organisation that they last worked for.
 * @throws Invalid where address and password do not belong together, Conflict where there were too many tries,
 * NotAllowed where no organisation gives them access any more
 */
export async function signIn(visitor: Visitor, input: SignIn): Promise<LetIn> {
  const person = await checkPassword(visitor, input)
  const scope = deployment()
  const choices = await memberships.listOfPerson(scope, person.id)
  const last = await sessions.findLastOrganisation(scope, person.id)
  const chosen = choices.find((one) => one.organisationId === last) ?? choices[0]
  if (!chosen)
    throw new NotAllowed(
      'No organisation gives you access any more. Ask your compliance manager to invite you again.',
    )
  const sessionId = await beginSession(scope, person.id, chosen.organisationId)
  return { sessionId, personId: person.id, device: deviceWith(visitor.device, person.email) }
}
