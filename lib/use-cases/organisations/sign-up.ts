import { z } from 'zod'
import { deployment, type DeploymentScope, inDeploymentTransaction, type WritingScope } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as memberships from '@/db/repositories/memberships'
import * as organisations from '@/db/repositories/organisations'
import * as people from '@/db/repositories/people'
import { isDuplicate } from '@/db/duplicate'
import { emailAddress, personName } from '@/lib/access/sign-in-fields'
import { nation, organisationName } from '@/lib/organisations/organisation'
import { slugOf } from '@/lib/organisations/slug-of'
import { newId } from '@/lib/platform/new-id'
import { beginReset, FIRST_PASSWORD_HOURS } from '@/lib/use-cases/people/begin-reset'
import { mayWriteTo } from '@/lib/use-cases/people/letter-limits'
import { sendLink, sendNotice } from '@/lib/use-cases/people/send-link'
import { unhurried } from '@/lib/use-cases/people/unhurried'
import { type Visitor } from '@/lib/use-cases/people/visitor'

export const SignUp = z.object({ name: personName, email: emailAddress, organisationName, nation })
export type SignUp = z.infer<typeof SignUp>

/**
 * Begins a register for a small landlord. The password is chosen behind the link that goes to the address, so that
 * nobody can open an account in another's name, and so that the answer is the same, and takes the same time, for an
 * address that has an account: its owner is written to instead.
 * @throws Conflict where the visitor's network asked for too many
 */
export const signUp = (visitor: Visitor, input: SignUp): Promise<{ email: string }> =>
  unhurried(begin(visitor, input).then(() => ({ email: input.email })))

async function begin(visitor: Visitor, input: SignUp): Promise<void> {
  if (!(await mayWriteTo(visitor, input.email))) return
  const person = await people.findByEmail(deployment(), input.email)
  const [known] = person ? await memberships.listOfPerson(deployment(), person.id) : []
  if (person && known) return writeToKnown(person, known.organisationId)
  try {
    await openRegister(input, person)
  } catch (thrown) {
    if (!isDuplicate(thrown)) throw thrown // the same address twice at once: the first has its letter
  }
}

/** Makes the organisation; the person too, unless they are known from one that gives them no access any more. */
function openRegister(input: SignUp, known: people.Person | null): Promise<void> {
  const organisationId = newId()
  return inDeploymentTransaction(async (scope) => {
    const within = scope.within(organisationId)
    const person = known ?? {
      email: input.email,
      passwordHash: null,
      id: await people.insert(scope, { ...input, passwordHash: null }),
    }
    const slug = slugOf(input.organisationName)
    await organisations.insert(within, {
      slug,
      name: input.organisationName,
      kind: 'landlord',
      nation: input.nation,
    })
    await memberships.grant(within, person.id, { role: 'manager', patches: 'all' })
    const entry = { did: 'organisation.signed-up', subjectKind: 'organisation', subjectId: organisationId }
    await audit.record(within, {
      actorId: person.id,
      ...entry,
      detail: { kind: 'landlord', nation: input.nation },
    })
    await writeTo(scope, within, person, 'Your register is ready.')
  })
}

/** The owner of an address that has access to something already: nothing is made. */
const writeToKnown = (person: people.Person, organisationId: string): Promise<void> =>
  inDeploymentTransaction((scope) =>
    writeTo(
      scope,
      scope.within(organisationId),
      person,
      'You have an account already, so nothing was changed.',
    ),
  )

/** The link to choose a first password, or where there is one, the way to sign in. */
async function writeTo(
  scope: DeploymentScope,
  within: WritingScope,
  person: Pick<people.Person, 'id' | 'email' | 'passwordHash'>,
  word: string,
): Promise<void> {
  if (person.passwordHash === null)
    return sendLink(within, {
      to: person.email,
      kind: 'sign-up',
      subject: 'Choose your password for Fuseward',
      paragraphs: ['You signed up for Fuseward. Choose a password with this link, and you are in.'],
      linkText: 'Choose your password',
      path: '/reset-password',
      token: await beginReset(scope, person.id, FIRST_PASSWORD_HOURS),
      closing: [
        'The link works once, within a day.',
        'If it was not you, do nothing: nobody gets in without the link.',
      ],
    })
  await sendNotice(within, {
    to: person.email,
    businessKey: `signed-up/${newId()}`,
    subject: 'You signed up for Fuseward',
    paragraphs: [`Somebody signed up with this address. ${word}`],
    linkText: 'Sign in',
    path: '/sign-in',
    closing: [
      'If you do not remember your password, choose “Forgotten password” on that page. If it was not you, do nothing.',
    ],
  })
}
