import { beforeAll, describe, expect, it } from 'vitest'
import { aVisitor } from '@/tests/builders/a-visitor'
import { type AnOrganisation, anOrganisation } from '@/tests/builders/an-organisation'
import { PASSWORD, withPassword } from '@/tests/builders/with-password'
import { deployment } from '@/db/connection'
import { Conflict, Invalid, NotAllowed } from '@/lib/errors/expected'
import { endSession } from '@/lib/use-cases/people/end-session'
import { readActor } from '@/lib/use-cases/people/read-actor'
import { signIn } from '@/lib/use-cases/people/sign-in'

let homes: AnOrganisation
beforeAll(async () => {
  homes = await anOrganisation()
  await withPassword(homes.manager)
  await withPassword(homes.officer)
})

const refusalOf = (attempt: Promise<unknown>) =>
  attempt.then(
    () => null,
    (thrown: unknown) => thrown,
  )

describe('signing in', () => {
  it('begins a session that stands for the person, their role and their patches', async () => {
    const { sessionId } = await signIn(aVisitor(), { email: homes.officer.email, password: PASSWORD })
    expect(await readActor(sessionId)).toEqual(homes.officer)
  })

  it('gives a wrong name, a wrong password and a person without a password the same answer', async () => {
    const known = await refusalOf(
      signIn(aVisitor(), { email: homes.manager.email, password: 'wrong wrong wrong' }),
    )
    const unknown = await refusalOf(signIn(aVisitor(), { email: 'nobody@lets.example', password: PASSWORD }))
    const passwordless = await refusalOf(
      signIn(aVisitor(), { email: homes.auditor.email, password: PASSWORD }),
    )
    expect(known).toBeInstanceOf(Invalid)
    expect((known as Invalid).problems).toEqual([
      { field: 'email', problem: 'That e-mail address and that password do not belong together.' },
    ])
    expect(unknown).toEqual(known)
    expect(passwordless).toEqual(known)
  })

  it('stores nothing of the password in the session, and only a hash with the person', async () => {
    const rows = JSON.stringify(await deployment().db('people').select('*'))
    expect(rows).not.toContain(PASSWORD)
    expect(rows).toContain('$argon2id$')
  })

  it('tells a person without any access left, once the password was right', async () => {
    const gone = await anOrganisation()
    await withPassword(gone.auditor)
    await deployment()
      .db('memberships')
      .where({ person_id: gone.auditor.personId })
      .update({ ended_at: new Date() })
    const given = { email: gone.auditor.email, password: PASSWORD }
    expect(await refusalOf(signIn(aVisitor(), given))).toBeInstanceOf(NotAllowed)
    expect(await refusalOf(signIn(aVisitor(), { ...given, password: 'wrong wrong wrong' }))).toBeInstanceOf(
      Invalid,
    )
  })
})

describe('a session', () => {
  const begin = () => signIn(aVisitor(), { email: homes.manager.email, password: PASSWORD })
  const sessionRow = (id: string) => deployment().db('sessions').where({ id })

  it('that was ended stands for nobody from the next request on', async () => {
    const { sessionId } = await begin()
    await endSession(sessionId)
    expect(await readActor(sessionId)).toBeNull()
  })

  it('runs out', async () => {
    const { sessionId } = await begin()
    await sessionRow(sessionId).update({ expires_at: new Date(Date.now() - 1) })
    expect(await readActor(sessionId)).toBeNull()
  })

  it('is prolonged by use, and never past seven days', async () => {
    const { sessionId } = await begin()
    const begun = new Date(Date.now() - 6.9 * 86_400_000)
    await sessionRow(sessionId).update({ created_at: begun, expires_at: new Date(Date.now() + 60_000) })
    expect(await readActor(sessionId)).not.toBeNull()
    const { expires_at } = (await sessionRow(sessionId).first('expires_at')) as { expires_at: Date }
    expect(Math.abs(expires_at.getTime() - (begun.getTime() + 7 * 86_400_000))).toBeLessThan(1000)
  })

  it('carries a new role and new patches at once', async () => {
    const { sessionId } = await signIn(aVisitor(), { email: homes.officer.email, password: PASSWORD })
    const mine = { person_id: homes.officer.personId, organisation_id: homes.organisationId }
    await deployment().db('membership_patches').where(mine).update({ patch_id: homes.patches.south })
    expect((await readActor(sessionId))?.patches).toEqual([homes.patches.south])
    await deployment().db('membership_patches').where(mine).update({ patch_id: homes.patches.north })
  })

  it.each(['', 'x', '0', "' or 1=1 -- ", '01900000-0000-7000-8000-000000000000'])(
    'named %j stands for nobody',
    async (id) => expect(await readActor(id)).toBeNull(),
  )
})

describe('many wrong tries', () => {
  const wrong = (visitor: ReturnType<typeof aVisitor>, email: string) =>
    refusalOf(signIn(visitor, { email, password: 'wrong wrong wrong' }))

  it('are refused by network and address together after ten, without keeping the owner out elsewhere', async () => {
    const { manager } = await anOrganisation()
    await withPassword(manager)
    const attacker = aVisitor()
    for (let attempt = 0; attempt < 10; attempt += 1)
      expect(await wrong(attacker, manager.email)).toBeInstanceOf(Invalid)
    expect(await wrong(attacker, manager.email)).toBeInstanceOf(Conflict)
    const right = { email: manager.email, password: PASSWORD }
    expect(await refusalOf(signIn(attacker, right))).toBeInstanceOf(Conflict)
    expect(await signIn(aVisitor(), right)).toHaveProperty('sessionId')
  })

  it('at once are all counted: not one more than ten gets to try', async () => {
    const attacker = aVisitor()
    const refusals = await Promise.all(
      Array.from({ length: 25 }, () => wrong(attacker, 'crowd@lets.example')),
    )
    expect(refusals.filter((one) => one instanceof Invalid)).toHaveLength(10)
    expect(refusals.filter((one) => one instanceof Conflict)).toHaveLength(15)
  })

  it('do not keep the owner out on a device they signed in on before, even on the attacker’s network', async () => {
    const { manager } = await anOrganisation()
    await withPassword(manager)
    const right = { email: manager.email, password: PASSWORD }
    const shared = aVisitor()
    const { device } = await signIn(shared, right)
    for (let attempt = 0; attempt < 12; attempt += 1) await wrong({ ...shared, device: null }, manager.email)
    expect(await refusalOf(signIn({ ...shared, device: null }, right))).toBeInstanceOf(Conflict)
    expect(await signIn({ ...shared, device }, right)).toHaveProperty('sessionId')
  })

  it('are counted for the device that made them, and a device of another person counts as a stranger', async () => {
    const { manager, officer } = await anOrganisation()
    await withPassword(manager)
    const visitor = aVisitor()
    const { device } = await signIn(visitor, { email: manager.email, password: PASSWORD })
    for (let attempt = 0; attempt < 10; attempt += 1) await wrong({ ...aVisitor(), device }, manager.email)
    expect(await wrong({ ...aVisitor(), device }, manager.email)).toBeInstanceOf(Conflict)
    const stranger = { ...aVisitor(), device }
    for (let attempt = 0; attempt < 10; attempt += 1) await wrong(stranger, officer.email)
    expect(await wrong(stranger, officer.email)).toBeInstanceOf(Conflict)
    expect(
      await wrong({ ...stranger, device: `${device?.split('.')[0]}.forged` }, officer.email),
    ).toBeInstanceOf(Conflict)
  })

  it('leave no address of a person or a network in the table', async () => {
    const rows = JSON.stringify(await deployment().db('rate_limits').select('*'))
    expect(rows).not.toMatch(/example|192\.0\.2/)
  })
})
