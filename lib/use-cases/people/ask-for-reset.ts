import { z } from 'zod'
import { deployment, inDeploymentTransaction } from '@/db/connection'
import * as memberships from '@/db/repositories/memberships'
import * as people from '@/db/repositories/people'
import { emailAddress } from '@/lib/access/sign-in-fields'
import { beginReset, RESET_HOURS } from './begin-reset'
import { mayWriteTo } from './letter-limits'
import { sendLink } from './send-link'
import { unhurried } from './unhurried'
import { type Visitor } from './visitor'

export const AskForReset = z.object({ email: emailAddress })

/**
 * Sends a link to choose a new password, where the address has access to anything. The answer is the same, and takes
 * the same time, whether it has or not.
 * @throws Conflict where the visitor's network asked for too many
 */
export const askForReset = (
  visitor: Visitor,
  { email }: z.infer<typeof AskForReset>,
): Promise<{ email: string }> => unhurried(sendReset(visitor, email).then(() => ({ email })))

async function sendReset(visitor: Visitor, email: string): Promise<void> {
  if (!(await mayWriteTo(visitor, email))) return
  const person = await people.findByEmail(deployment(), email)
  const organisation = person && (await memberships.listOfPerson(deployment(), person.id))[0]
  if (!person || !organisation) return
  await inDeploymentTransaction(async (scope) => {
    const token = await beginReset(scope, person.id, RESET_HOURS)
    await sendLink(scope.within(organisation.organisationId), {
      to: person.email,
      kind: 'password-reset',
      subject: 'Choose a new password for Fuseward',
      paragraphs: [
        'Somebody asked for a new password for this address. If that was you, choose one with this link.',
      ],
      linkText: 'Choose a new password',
      path: '/reset-password',
      token,
      closing: [
        'The link works once, within an hour. Choosing a new password signs you out everywhere else.',
        'If it was not you, do nothing: your password stays as it is.',
      ],
    })
  })
}
