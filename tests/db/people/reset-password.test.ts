import { describe, expect, it } from 'vitest'
import { aVisitor } from '@/tests/builders/a-visitor'
import { anOrganisation } from '@/tests/builders/an-organisation'
import { lettersTo, tokenTo } from '@/tests/builders/letters-to'
import { PASSWORD, withPassword } from '@/tests/builders/with-password'
import { deployment } from '@/db/connection'
import { Conflict, Invalid } from '@/lib/errors/expected'
import { askForReset } from '@/lib/use-cases/people/ask-for-reset'
import { changePassword } from '@/lib/use-cases/people/change-password'
import { readActor } from '@/lib/use-cases/people/read-actor'
import { resetPassword } from '@/lib/use-cases/people/reset-password'
import { showReset } from '@/lib/use-cases/people/show-reset'
import { signIn } from '@/lib/use-cases/people/sign-in'

const NEW = 'fence over wednesday'

async function somebody() {
  const { manager } = await anOrganisation()
  return withPassword(manager)
}

describe('a forgotten password', () => {
  it('is answered the same whether the address is known or not; only the known one is written to', async () => {
    const { email } = await somebody()
    expect(await askForReset(aVisitor(), { email })).toEqual({ email })
    expect(await askForReset(aVisitor(), { email: 'nobody@lets.example' })).toEqual({
      email: 'nobody@lets.example',
    })
    expect((await lettersTo(email)).map((letter) => letter.subject)).toEqual([
      'Choose a new password for Fuseward',
    ])
    expect(await lettersTo('nobody@lets.example')).toEqual([])
  })

  it('is replaced by the link, which ends every session and signs in here', async () => {
    const { email } = await somebody()
    const elsewhere = await Promise.all([1, 2].map(() => signIn(aVisitor(), { email, password: PASSWORD })))
    await askForReset(aVisitor(), { email })
    const token = await tokenTo(email)
    expect(await showReset(token)).toEqual({ email, isFirst: false })
    const here = await resetPassword(aVisitor(), { token, password: NEW })
    expect(await Promise.all(elsewhere.map(({ sessionId }) => readActor(sessionId)))).toEqual([null, null])
    expect(await readActor(here.sessionId)).toMatchObject({ email })
    await expect(signIn(aVisitor(), { email, password: PASSWORD })).rejects.toBeInstanceOf(Invalid)
    expect(await signIn(aVisitor(), { email, password: NEW })).toHaveProperty('sessionId')
    expect(await showReset(token)).toBeNull()
  })

  it('is replaced once by one link, however many try at once', async () => {
    const { email } = await somebody()
    await askForReset(aVisitor(), { email })
    const token = await tokenTo(email)
    const outcomes = await Promise.allSettled(
      Array.from({ length: 8 }, (_, at) => resetPassword(aVisitor(), { token, password: `${NEW} ${at}` })),
    )
    expect(outcomes.filter((one) => one.status === 'fulfilled')).toHaveLength(1)
    for (const one of outcomes) if (one.status === 'rejected') expect(one.reason).toBeInstanceOf(Conflict)
  })

  it('takes every other link of the person with it', async () => {
    const { email } = await somebody()
    await askForReset(aVisitor(), { email })
    const first = await tokenTo(email)
    await askForReset(aVisitor(), { email })
    await resetPassword(aVisitor(), { token: await tokenTo(email), password: NEW })
    await expect(resetPassword(aVisitor(), { token: first, password: PASSWORD })).rejects.toBeInstanceOf(
      Conflict,
    )
  })

  it('keeps the link when the new one will not do', async () => {
    const { email } = await somebody()
    await askForReset(aVisitor(), { email })
    const token = await tokenTo(email)
    await expect(resetPassword(aVisitor(), { token, password: 'password1' })).rejects.toBeInstanceOf(Invalid)
    await expect(resetPassword(aVisitor(), { token, password: email })).rejects.toBeInstanceOf(Invalid)
    expect(await resetPassword(aVisitor(), { token, password: NEW })).toHaveProperty('sessionId')
  })

  it('has a link of one hour', async () => {
    const { email, personId } = await somebody()
    await askForReset(aVisitor(), { email })
    const row = (await deployment().db('password_resets').where({ person_id: personId }).first()) as Record<
      string,
      Date
    >
    expect(row.expires_at!.getTime() - row.created_at!.getTime()).toBe(3_600_000)
    await deployment()
      .db('password_resets')
      .where({ person_id: personId })
      .update({ expires_at: new Date(Date.now() - 1) })
    await expect(
      resetPassword(aVisitor(), { token: await tokenTo(email), password: NEW }),
    ).rejects.toBeInstanceOf(Conflict)
  })

  it('leaves no token in the tables of people', async () => {
    const { email } = await somebody()
    await askForReset(aVisitor(), { email })
    expect(JSON.stringify(await deployment().db('password_resets').select('*'))).not.toContain(
      await tokenTo(email),
    )
  })

  it('opens nothing for somebody whose access has ended meanwhile', async () => {
    const { email, personId } = await somebody()
    await askForReset(aVisitor(), { email })
    const token = await tokenTo(email)
    await deployment().db('memberships').where({ person_id: personId }).update({ ended_at: new Date() })
    await expect(resetPassword(aVisitor(), { token, password: NEW })).rejects.toBeInstanceOf(Conflict)
    await askForReset(aVisitor(), { email })
    expect(await lettersTo(email)).toHaveLength(1)
  })
})

describe('changing one’s own password', () => {
  it('ends every other session and keeps this one', async () => {
    const actor = await somebody()
    const { email } = actor
    const [here, there] = await Promise.all(
      [1, 2].map(() => signIn(aVisitor(), { email, password: PASSWORD })),
    )
    const given = {
      currentPassword: PASSWORD,
      password: NEW,
      visitor: aVisitor(),
      sessionId: here!.sessionId,
    }
    expect(await changePassword(actor, given)).toEqual({ ended: 1 })
    expect(await readActor(here!.sessionId)).toMatchObject({ email })
    expect(await readActor(there!.sessionId)).toBeNull()
  })

  it('needs the current one', async () => {
    const actor = await somebody()
    const given = { currentPassword: 'wrong wrong', password: NEW, visitor: aVisitor(), sessionId: null }
    await expect(changePassword(actor, given)).rejects.toMatchObject({
      problems: [{ field: 'currentPassword' }],
    })
  })
})
