import { describe, expect, it } from 'vitest'
import { aVisitor } from '@/tests/builders/a-visitor'
import { anOrganisation } from '@/tests/builders/an-organisation'
import { lettersTo, tokenTo } from '@/tests/builders/letters-to'
import { PASSWORD, withPassword } from '@/tests/builders/with-password'
import { deployment, reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import { Conflict, Invalid } from '@/lib/errors/expected'
import { signUp, SignUp } from '@/lib/use-cases/organisations/sign-up'
import { readActor } from '@/lib/use-cases/people/read-actor'
import { resetPassword } from '@/lib/use-cases/people/reset-password'
import { signIn } from '@/lib/use-cases/people/sign-in'

const given = (email: string, organisationName = 'Oakshott Lettings') =>
  SignUp.parse({ name: 'Pat Oakshott', email, organisationName, nation: 'wales' })

describe('signing up', () => {
  it('makes an organisation with its first manager, who gets in by the link of the letter', async () => {
    const visitor = aVisitor()
    expect(await signUp(visitor, given('Pat@Lets.Example'))).toEqual({ email: 'pat@lets.example' })
    const { sessionId } = await resetPassword(visitor, {
      token: await tokenTo('pat@lets.example'),
      password: PASSWORD,
    })
    const actor = await readActor(sessionId)
    expect(actor).toMatchObject({
      name: 'Pat Oakshott',
      role: 'manager',
      patches: 'all',
      organisationName: 'Oakshott Lettings',
    })
    const organisation = await deployment().db('organisations').where({ id: actor?.organisationId }).first()
    expect(organisation).toMatchObject({
      kind: 'landlord',
      nation: 'wales',
      slug: 'oakshott-lettings',
      notice_days: 90,
    })
    const trail = await audit.list(reading(actor!), { limit: 10 })
    expect(trail.map((entry) => entry.did)).toEqual(['person.password-chosen', 'organisation.signed-up'])
    expect(await signIn(aVisitor(), { email: 'pat@lets.example', password: PASSWORD })).toHaveProperty(
      'sessionId',
    )
  })

  it('lets nobody in before the link was followed', async () => {
    await signUp(aVisitor(), given('early@lets.example'))
    await expect(
      signIn(aVisitor(), { email: 'early@lets.example', password: PASSWORD }),
    ).rejects.toBeInstanceOf(Invalid)
  })

  it('answers the same for an address that has an account, makes nothing, and writes to its owner', async () => {
    const { manager } = await anOrganisation()
    await withPassword(manager)
    const count = async () => (await deployment().db('organisations').select('id')).length
    const before = await count()
    expect(await signUp(aVisitor(), given(manager.email))).toEqual({ email: manager.email })
    expect(await count()).toBe(before)
    const letters = await lettersTo(manager.email)
    expect(letters.map((letter) => letter.subject)).toEqual(['You signed up for Fuseward'])
    expect(letters[0]?.token).toBeNull()
    expect(letters[0]?.text).not.toContain('Oakshott')
  })

  it('takes its time for either, so that the time tells nothing', async () => {
    const { manager } = await anOrganisation()
    const timed = async (email: string) => {
      const start = performance.now()
      await signUp(aVisitor(), given(email))
      return performance.now() - start
    }
    expect(await timed(manager.email)).toBeGreaterThanOrEqual(399)
    expect(await timed('fresh@lets.example')).toBeGreaterThanOrEqual(399)
  })

  it('opens a register for somebody whose access elsewhere has ended', async () => {
    const { auditor } = await anOrganisation()
    await withPassword(auditor)
    await deployment()
      .db('memberships')
      .where({ person_id: auditor.personId })
      .update({ ended_at: new Date() })
    await signUp(aVisitor(), given(auditor.email, 'Quill Lettings'))
    const { sessionId } = await signIn(aVisitor(), { email: auditor.email, password: PASSWORD })
    expect(await readActor(sessionId)).toMatchObject({
      role: 'manager',
      organisationName: 'Quill Lettings',
      personId: auditor.personId,
    })
  })

  it('gives organisations of one name different slugs, and one address one account, at once too', async () => {
    await Promise.all(
      ['one@lets.example', 'two@lets.example', 'three@lets.example'].map((email) =>
        signUp(aVisitor(), given(email, 'Same Name')),
      ),
    )
    const slugs = await deployment()
      .db('organisations')
      .where({ name: 'Same Name' })
      .orderBy('slug')
      .pluck('slug')
    expect(slugs).toEqual(['same-name', 'same-name-2', 'same-name-3'])
    await Promise.all([1, 2, 3].map(() => signUp(aVisitor(), given('twice@lets.example', 'Twice'))))
    expect(await deployment().db('people').where({ email: 'twice@lets.example' }).pluck('name')).toEqual([
      'Pat Oakshott',
    ])
    expect(await deployment().db('organisations').where({ name: 'Twice' }).pluck('slug')).toEqual(['twice'])
  })

  it('floods nobody: after five letters in an hour the answer stays and the letters stop', async () => {
    for (let attempt = 0; attempt < 7; attempt += 1)
      expect(await signUp(aVisitor(), given('flood@lets.example'))).toEqual({ email: 'flood@lets.example' })
    expect(await lettersTo('flood@lets.example')).toHaveLength(5)
  })

  it('is refused to a network that asks for too many letters', async () => {
    const visitor = aVisitor()
    const refused = await Promise.all(
      Array.from({ length: 62 }, (_, at) =>
        signUp(visitor, given(`many${at}@lets.example`)).then(
          () => null,
          (thrown: unknown) => thrown,
        ),
      ),
    )
    expect(refused.filter((one) => one instanceof Conflict)).toHaveLength(2)
  })
})

it.each([
  [{ email: 'not an address' }, 'email'],
  [{ organisationName: ' ' }, 'organisationName'],
  [{ nation: 'france' }, 'nation'],
  [{ name: 'x'.repeat(121) }, 'name'],
])('sign-up with %j is refused at its field', (wrong, field) => {
  const result = SignUp.safeParse({ ...given('a@lets.example'), ...wrong })
  expect(result.error?.issues.map((issue) => issue.path[0])).toEqual([field])
})
