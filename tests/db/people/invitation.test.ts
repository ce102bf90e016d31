import { beforeEach, describe, expect, it } from 'vitest'
import { aVisitor } from '@/tests/builders/a-visitor'
import { type AnOrganisation, anOrganisation } from '@/tests/builders/an-organisation'
import { lettersTo, tokenTo } from '@/tests/builders/letters-to'
import { PASSWORD, withPassword } from '@/tests/builders/with-password'
import { deployment } from '@/db/connection'
import { Invalid, NotAllowed, NotFound } from '@/lib/errors/expected'
import { acceptInvitation } from '@/lib/use-cases/people/accept-invitation'
import { invitePerson, InvitePerson } from '@/lib/use-cases/people/invite-person'
import { listPeople } from '@/lib/use-cases/people/list-people'
import { readActor } from '@/lib/use-cases/people/read-actor'
import { resendInvitation } from '@/lib/use-cases/people/resend-invitation'
import { showInvitation } from '@/lib/use-cases/people/show-invitation'
import { signIn } from '@/lib/use-cases/people/sign-in'
import { withdrawInvitation } from '@/lib/use-cases/people/withdraw-invitation'

let homes: AnOrganisation
let email: string
let next = 0
beforeEach(async () => {
  homes = await anOrganisation()
  email = `new.officer.${(next += 1)}@lets.example`
})

const invite = (patchIds: string[] = []) =>
  invitePerson(homes.manager, InvitePerson.parse({ email, role: 'officer', patchIds }))
const open = async () => (await listPeople(homes.manager)).invitations
const accept = async (given: { name?: string; password?: string; token?: string } = {}) =>
  acceptInvitation(aVisitor(), {
    token: given.token ?? (await tokenTo(email)),
    name: given.name ?? 'Nia Fernhollow',
    password: given.password ?? PASSWORD,
  })

describe('an invitation', () => {
  it('lets a new person in, with the role and the patches that were chosen', async () => {
    await invite([homes.patches.south])
    expect(await showInvitation(await tokenTo(email))).toEqual({
      email,
      role: 'officer',
      organisationName: homes.manager.organisationName,
      hasPassword: false,
    })
    const { sessionId } = await accept()
    expect(await readActor(sessionId)).toMatchObject({
      ...{ email, name: 'Nia Fernhollow', role: 'officer', patches: [homes.patches.south] },
      organisationId: homes.organisationId,
    })
    expect(await open()).toEqual([])
    expect((await listPeople(homes.manager)).people.find((one) => one.email === email)).toMatchObject({
      patchNames: ['South'],
    })
  })

  it('lives seven days, and is stored as a hash', async () => {
    await invite()
    const row = (await deployment().db('invitations').where({ email }).first()) as {
      created_at: Date
      expires_at: Date
    }
    expect(row.expires_at.getTime() - row.created_at.getTime()).toBe(7 * 86_400_000)
    expect(JSON.stringify(row)).not.toContain(await tokenTo(email))
    await deployment()
      .db('invitations')
      .where({ email })
      .update({ expires_at: new Date(Date.now() - 1) })
    expect(await showInvitation(await tokenTo(email))).toBeNull()
    await expect(accept()).rejects.toBeInstanceOf(NotFound)
    expect((await open())[0]).toMatchObject({ email, hasRunOut: true })
  })

  it('is taken up once, however many try at once', async () => {
    await invite()
    const token = await tokenTo(email)
    const outcomes = await Promise.allSettled(Array.from({ length: 6 }, () => accept({ token })))
    expect(outcomes.filter((one) => one.status === 'fulfilled')).toHaveLength(1)
    expect(await deployment().db('people').where({ email }).pluck('name')).toEqual(['Nia Fernhollow'])
    for (const one of outcomes)
      if (one.status === 'rejected')
        expect(one.reason).toMatchObject({ kind: expect.stringMatching(/not-found|conflict/) as string })
  })

  it('asks somebody with an account for its password, and makes no second account', async () => {
    const other = await anOrganisation({ name: 'Second Housing' })
    await withPassword(other.auditor)
    email = other.auditor.email
    await invite()
    expect(await showInvitation(await tokenTo(email))).toMatchObject({ hasPassword: true })
    await expect(accept({ password: 'another password' })).rejects.toMatchObject({
      problems: [{ field: 'password' }],
    })
    const { sessionId, personId } = await accept()
    expect(personId).toBe(other.auditor.personId)
    expect(await readActor(sessionId)).toMatchObject({
      name: other.auditor.name,
      role: 'officer',
      organisationId: homes.organisationId,
    })
  })

  it('gives access again to somebody whose access had ended', async () => {
    await withPassword(homes.auditor)
    email = homes.auditor.email
    await deployment()
      .db('memberships')
      .where({ person_id: homes.auditor.personId })
      .update({ ended_at: new Date() })
    await invite()
    await accept()
    expect(await signIn(aVisitor(), { email, password: PASSWORD })).toHaveProperty('sessionId')
  })

  it('that was sent again has a new link; the old one ends', async () => {
    await invite()
    const old = await tokenTo(email)
    const [invitation] = await open()
    await resendInvitation(homes.manager, { invitationId: invitation!.id })
    expect(await lettersTo(email)).toHaveLength(2)
    expect(await tokenTo(email)).not.toBe(old)
    await expect(accept({ token: old })).rejects.toBeInstanceOf(NotFound)
    expect(await accept()).toHaveProperty('sessionId')
    await expect(resendInvitation(homes.manager, { invitationId: invitation!.id })).rejects.toBeInstanceOf(
      NotFound,
    )
  })

  it('that was withdrawn opens nothing', async () => {
    await invite()
    const [invitation] = await open()
    await withdrawInvitation(homes.manager, { invitationId: invitation!.id })
    await expect(accept()).rejects.toBeInstanceOf(NotFound)
    expect(await open()).toEqual([])
  })

  it('is not sent to somebody who has access or an invitation already', async () => {
    await invite()
    await expect(invite()).rejects.toMatchObject({ problems: [{ field: 'email' }] })
    email = homes.officer.email
    await expect(invite()).rejects.toMatchObject({ problems: [{ field: 'email' }] })
  })

  it('needs a name and a password that will do, and says both at once', async () => {
    await invite()
    await expect(accept({ name: ' ', password: 'password1' })).rejects.toMatchObject({
      problems: [{ field: 'name' }, { field: 'password' }],
    })
    expect(await accept()).toHaveProperty('sessionId')
  })

  it('holds no patch of another organisation', async () => {
    const other = await anOrganisation()
    await expect(invite([other.patches.north])).rejects.toBeInstanceOf(Invalid)
    expect(await lettersTo(email)).toEqual([])
  })

  it('of another organisation is not found, to send again or to withdraw', async () => {
    await invite()
    const [invitation] = await open()
    const other = await anOrganisation()
    await expect(resendInvitation(other.manager, { invitationId: invitation!.id })).rejects.toBeInstanceOf(
      NotFound,
    )
    await expect(withdrawInvitation(other.manager, { invitationId: invitation!.id })).rejects.toBeInstanceOf(
      NotFound,
    )
    expect((await listPeople(other.manager)).invitations).toEqual([])
    expect(await accept()).toHaveProperty('sessionId')
  })

  it('is a manager’s to send', async () => {
    for (const actor of [homes.officer, homes.auditor, homes.supervisor, homes.electrician])
      await expect(invitePerson(actor, { email, role: 'manager', patchIds: [] })).rejects.toBeInstanceOf(
        NotAllowed,
      )
  })
})
