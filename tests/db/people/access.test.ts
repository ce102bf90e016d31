import { beforeEach, describe, expect, it } from 'vitest'
import { aVisitor } from '@/tests/builders/a-visitor'
import { type AnOrganisation, anOrganisation } from '@/tests/builders/an-organisation'
import { PASSWORD, withPassword } from '@/tests/builders/with-password'
import { inTransaction, reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as memberships from '@/db/repositories/memberships'
import { Conflict, NotAllowed, NotFound } from '@/lib/errors/expected'
import { changeAccess } from '@/lib/use-cases/people/change-access'
import { endAccess } from '@/lib/use-cases/people/end-access'
import { listOrganisations } from '@/lib/use-cases/people/list-organisations'
import { listPeople } from '@/lib/use-cases/people/list-people'
import { readActor } from '@/lib/use-cases/people/read-actor'
import { showPerson } from '@/lib/use-cases/people/show-person'
import { signIn } from '@/lib/use-cases/people/sign-in'
import { switchOrganisation } from '@/lib/use-cases/people/switch-organisation'

let homes: AnOrganisation
let other: AnOrganisation
beforeEach(async () => {
  homes = await anOrganisation()
  other = await anOrganisation({ name: 'Second Housing' })
})

const sessionOf = async (actor: { email: string }) =>
  (await signIn(aVisitor(), { email: actor.email, password: PASSWORD })).sessionId

describe('changing somebody’s access', () => {
  it('holds from their next request', async () => {
    await withPassword(homes.officer)
    const session = await sessionOf(homes.officer)
    const change = {
      personId: homes.officer.personId,
      role: 'officer',
      patchIds: [homes.patches.south],
    } as const
    await changeAccess(homes.manager, { ...change, patchIds: [...change.patchIds] })
    expect((await readActor(session))?.patches).toEqual([homes.patches.south])
    await changeAccess(homes.manager, {
      personId: homes.officer.personId,
      role: 'auditor',
      patchIds: [homes.patches.south],
    })
    expect(await readActor(session)).toMatchObject({ role: 'auditor', patches: 'all' })
    await changeAccess(homes.manager, { personId: homes.officer.personId, role: 'electrician', patchIds: [] })
    expect(await readActor(session)).toMatchObject({ role: 'electrician', patches: [] })
  })

  it('is on record, with what was and what is', async () => {
    await changeAccess(homes.manager, { personId: homes.officer.personId, role: 'manager', patchIds: [] })
    const [entry] = await audit.list(reading(homes.manager), { limit: 1 })
    expect(entry).toMatchObject({
      did: 'person.access-changed',
      actorId: homes.manager.personId,
      subjectId: homes.officer.personId,
      detail: { role: ['officer', 'manager'], patches: [[homes.patches.north], 'all'] },
    })
  })

  it('never reaches another organisation', async () => {
    const change = { personId: other.officer.personId, role: 'manager', patchIds: [] } as const
    await expect(changeAccess(homes.manager, { ...change, patchIds: [] })).rejects.toBeInstanceOf(NotFound)
    await expect(endAccess(homes.manager, change)).rejects.toBeInstanceOf(NotFound)
    await expect(showPerson(homes.manager, change)).rejects.toBeInstanceOf(NotFound)
    expect((await listPeople(homes.manager)).people).toHaveLength(5)
  })
})

describe('ending somebody’s access', () => {
  it('ends their sessions here at once, and leaves those elsewhere', async () => {
    await withPassword(homes.officer)
    await inTransaction(other.manager, (scope) =>
      memberships.grant(scope, homes.officer.personId, { role: 'auditor', patches: 'all' }),
    )
    const here = await sessionOf(homes.officer)
    const elsewhere = (
      await switchOrganisation(homes.officer, {
        organisationId: other.organisationId,
        sessionId: await sessionOf(homes.officer),
      })
    ).sessionId
    await endAccess(homes.manager, { personId: homes.officer.personId })
    expect(await readActor(here)).toBeNull()
    expect(await readActor(elsewhere)).toMatchObject({
      role: 'auditor',
      organisationId: other.organisationId,
    })
    await expect(endAccess(homes.manager, { personId: homes.officer.personId })).rejects.toBeInstanceOf(
      NotFound,
    )
  })

  it('is not for the last manager, nor may they become something else', async () => {
    const last = { personId: homes.manager.personId }
    await expect(endAccess(homes.manager, last)).rejects.toBeInstanceOf(Conflict)
    await expect(
      changeAccess(homes.manager, { ...last, role: 'officer', patchIds: [] }),
    ).rejects.toBeInstanceOf(Conflict)
    await changeAccess(homes.manager, { ...last, role: 'manager', patchIds: [] })
    expect(await showPerson(homes.manager, last)).toMatchObject({ isLastManager: true, isSelf: true })
  })

  it('leaves one manager where two give up at once', async () => {
    await changeAccess(homes.manager, { personId: homes.auditor.personId, role: 'manager', patchIds: [] })
    const both = [homes.manager, { ...homes.auditor, role: 'manager' as const }]
    const outcomes = await Promise.allSettled(
      both.map((actor) => endAccess(actor, { personId: actor.personId })),
    )
    expect(outcomes.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(await memberships.countManagers(reading(homes.manager))).toBe(1)
  })

  it('is a manager’s to do', async () => {
    for (const actor of [homes.officer, homes.auditor, homes.supervisor, homes.electrician])
      await expect(endAccess(actor, { personId: homes.manager.personId })).rejects.toBeInstanceOf(NotAllowed)
  })
})

describe('going over to another organisation', () => {
  beforeEach(async () => {
    await withPassword(homes.officer)
    await inTransaction(other.manager, (scope) =>
      memberships.grant(scope, homes.officer.personId, { role: 'auditor', patches: 'all' }),
    )
  })

  it('puts a new session in the place of the old one, and is where the next sign-in begins', async () => {
    expect((await listOrganisations(homes.officer)).map((one) => one.name).sort()).toEqual([
      'Harrowgate Homes',
      'Second Housing',
    ])
    const sessionId = await sessionOf(homes.officer)
    const next = await switchOrganisation(homes.officer, { organisationId: other.organisationId, sessionId })
    expect(await readActor(sessionId)).toBeNull()
    expect(await readActor(next.sessionId)).toMatchObject({
      organisationId: other.organisationId,
      role: 'auditor',
    })
    expect(await readActor(await sessionOf(homes.officer))).toMatchObject({
      organisationId: other.organisationId,
    })
  })

  it('never leads to one that gives no access', async () => {
    const third = await anOrganisation()
    const sessionId = await sessionOf(homes.officer)
    await expect(
      switchOrganisation(homes.officer, { organisationId: third.organisationId, sessionId }),
    ).rejects.toBeInstanceOf(NotFound)
    await endAccess(other.manager, { personId: homes.officer.personId })
    await expect(
      switchOrganisation(homes.officer, { organisationId: other.organisationId, sessionId }),
    ).rejects.toBeInstanceOf(NotFound)
    expect(await readActor(sessionId)).toMatchObject({ organisationId: homes.organisationId })
  })
})
