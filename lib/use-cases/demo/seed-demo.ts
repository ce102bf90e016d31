import { deployment, inDeploymentTransaction, type WritingScope } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import { findByKeys } from '@/db/repositories/home-intake'
import * as memberships from '@/db/repositories/memberships'
import * as organisations from '@/db/repositories/organisations'
import * as patches from '@/db/repositories/patches'
import * as people from '@/db/repositories/people'
import { type DemoHome } from '@/db/seeds/portfolio/demo-home'
import { DEMO_PASSWORD } from '@/db/seeds/portfolio/demo-people'
import { DEMO_ORGANISATIONS, demoHomes, type DemoOrganisation } from '@/db/seeds/portfolio/demo-portfolio'
import { type Role } from '@/lib/access/role'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { hashPassword } from '@/lib/gateways/password'
import { newId } from '@/lib/platform/new-id'
import { refreshHomes } from '@/lib/use-cases/homes/refresh-homes'
import { createDraftApplier } from '@/lib/use-cases/imports/apply-drafts'
import { recordDetails } from './record-details'
import { recordImport } from './record-import'

export type DemoSignIn = {
  readonly organisation: string
  readonly name: string
  readonly role: Role
  readonly email: string
  readonly password: string
}
export type Seeded = {
  readonly organisation: string
  readonly people: number
  readonly homes: number
  readonly inspections: number
}

/** How anybody of the demo signs in. */
export const demoSignIns = (): DemoSignIn[] =>
  DEMO_ORGANISATIONS.flatMap((organisation) =>
    organisation.people.map(({ name, role, email }) => ({
      organisation: organisation.name,
      name,
      role,
      email,
      password: DEMO_PASSWORD,
    })),
  )

/**
 * Fills the register with the demo: two organisations, their people and their homes, each organisation in one
 * transaction. An organisation that is there is left alone. For the operator's command only: it takes no actor.
 * @returns what was made; empty where all of it was there
 */
export async function seedDemo(today: CalendarDay): Promise<Seeded[]> {
  const missing: DemoOrganisation[] = []
  for (const organisation of DEMO_ORGANISATIONS)
    if (!(await organisations.findBySlug(deployment(), organisation.slug))) missing.push(organisation)
  if (missing.length === 0) return []
  const homes = demoHomes(today)
  const seeded: Seeded[] = []
  for (const organisation of missing)
    seeded.push(await seedOne(organisation, homes[organisation.slug], today))
  return seeded
}

async function seedOne(
  organisation: DemoOrganisation,
  homes: readonly DemoHome[],
  today: CalendarDay,
): Promise<Seeded> {
  const organisationId = newId()
  const hashes = await Promise.all(organisation.people.map(() => hashPassword(DEMO_PASSWORD)))
  await inDeploymentTransaction(async (everywhere) => {
    const scope = everywhere.within(organisationId)
    await organisations.insert(scope, organisation)
    const ids: Partial<Record<Role, string>> = {}
    const byEmail = new Map<string, string>()
    for (const [at, { name, email, role }] of organisation.people.entries()) {
      const id = await people.insert(everywhere, { name, email, passwordHash: hashes[at] ?? null })
      byEmail.set(email, id)
      ids[role] ??= id
    }
    const manager = ids.manager as string
    const placed = await addHomes(scope, organisation, homes, manager, today)
    await grantAll(scope, organisation, byEmail)
    await recordDetails(scope, placed, { firm: ids.supervisor ?? manager, officer: ids.officer ?? manager })
    const detailed = placed.filter(
      ({ home }) => home.inspections.length + home.corrections.length + home.officerDefects.length > 0,
    )
    await refreshHomes(
      scope,
      detailed.map(({ homeId }) => homeId),
      today,
    )
    await audit.record(scope, {
      actorId: null,
      did: 'organisation.demo-seeded',
      subjectKind: 'organisation',
      subjectId: organisationId,
      detail: { homes: homes.length, people: organisation.people.length, today },
    })
  })
  return {
    organisation: organisation.name,
    people: organisation.people.length,
    homes: homes.length,
    inspections: homes.reduce((sum, home) => sum + home.inspections.length, 0),
  }
}

/** Takes the stock list in as an import would, and finds which home is whose. */
async function addHomes(
  scope: WritingScope,
  { nation, source }: DemoOrganisation,
  homes: readonly DemoHome[],
  actorId: string,
  today: CalendarDay,
) {
  const refused: string[] = []
  const onClash = (row: number, why: string) => refused.push(`row ${row}: ${why}`)
  const applier = await createDraftApplier(scope, { actorId, source, nation, today, onClash })
  await applier.apply(homes.map(({ draft }) => draft))
  await applier.finish()
  await recordImport(scope, {
    fileName: source,
    actorId,
    nation,
    drafts: homes.map(({ draft }) => draft),
    today,
    slips: homes.length > 100,
  })
  if (refused.length > 0)
    throw new Error(`The demo's own stock list does not fit: ${refused.slice(0, 3).join('; ')}`)
  const keys = await findByKeys(scope, {
    uprns: [],
    references: [],
    addressKeys: homes.map(({ draft }) => draft.addressKey),
  })
  const idOf = new Map(keys.map(({ addressKey, id }) => [addressKey, id]))
  return homes.map((home) => ({ homeId: idOf.get(home.draft.addressKey) as string, home }))
}

async function grantAll(
  scope: WritingScope,
  organisation: DemoOrganisation,
  idOf: ReadonlyMap<string, string>,
): Promise<void> {
  const patchIds = new Map((await patches.list(scope)).map(({ id, name }) => [name, id]))
  for (const { email, role, patches: names } of organisation.people)
    await memberships.grant(scope, idOf.get(email) as string, {
      role,
      patches: names ? names.map((name) => patchIds.get(name) as string) : 'all',
    })
}
