/** Nothing crosses from one organisation to another, or from one patch to another. */
import { beforeAll, describe, expect, it } from 'vitest'
import { reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import { pool } from '@/db/knex'
import { type Actor } from '@/lib/access/actor'
import { NotAllowed, NotFound } from '@/lib/errors/expected'
import { type HomeQuery, homeQueryOf } from '@/lib/homes/home-query'
import { newId } from '@/lib/platform/new-id'
import { addDefect } from '@/lib/use-cases/homes/add-defect'
import { AddHome, addHome } from '@/lib/use-cases/homes/add-home'
import { ChangeHome, changeHome } from '@/lib/use-cases/homes/change-home'
import { closeDefect } from '@/lib/use-cases/homes/close-defect'
import { countRewireableByPatch } from '@/lib/use-cases/homes/count-rewireable'
import { exportHomes } from '@/lib/use-cases/homes/export-homes'
import { filterChoices } from '@/lib/use-cases/homes/filter-choices'
import { findHomes } from '@/lib/use-cases/homes/find-homes'
import { listHomes } from '@/lib/use-cases/homes/list-homes'
import { recordFact } from '@/lib/use-cases/homes/record-fact'
import { RecordInspection, recordInspection } from '@/lib/use-cases/homes/record-inspection'
import { showHome } from '@/lib/use-cases/homes/show-home'
import { mapHomes } from '@/lib/use-cases/map/map-homes'
import { showToday } from '@/lib/use-cases/today/show-today'
import { anOrganisation, type AnOrganisation } from '@/tests/builders/an-organisation'
import { TODAY } from './some-homes'

let victim: AnOrganisation
let attacker: AnOrganisation
let inNorth: string
let inSouth: string
let inNone: string
let defectId: string

const added = async (owner: AnOrganisation, address: string, patch: string | null) => {
  const form = AddHome.parse({
    address,
    town: 'Quillhaven',
    postcode: 'ZX1 2AB',
    nation: 'england',
    tenure: 'social-rent',
    patch: patch ?? '',
    block: 'Secret House',
    latitude: '53.4',
    longitude: '0.9',
    'board-type': 'rewireable',
    'inspectedOn-day': '1',
    'inspectedOn-month': '3',
    'inspectedOn-year': '2015',
  })
  const { homeId } = await addHome(owner.manager, form, TODAY)
  return homeId
}

beforeAll(async () => {
  victim = await anOrganisation({ name: 'Victim Homes' })
  attacker = await anOrganisation({ name: 'Attacker Homes' })
  inNorth = await added(victim, '1 Secret Street', victim.patches.north)
  inSouth = await added(victim, '2 Secret Street', victim.patches.south)
  inNone = await added(victim, '3 Secret Street', null)
  const given = {
    homeId: inSouth,
    code: 'C2' as const,
    description: 'A cracked socket',
    location: null,
    raisedOn: undefined,
  }
  ;({ defectId } = await addDefect(victim.manager, given, TODAY))
})

const query = (given: Partial<HomeQuery> = {}): HomeQuery => ({ ...homeQueryOf({}), ...given })

async function everythingSeenBy(actor: Actor) {
  const exported: unknown[] = []
  for await (const row of (await exportHomes(actor, query(), TODAY)).rows) exported.push(row)
  const box = [-10, 49, 4, 62] as const
  return {
    list: await listHomes(actor, query(), TODAY),
    search: await listHomes(actor, query({ search: 'secret' }), TODAY),
    byPatch: await listHomes(actor, query({ patch: [victim.patches.south] }), TODAY),
    found: await findHomes(actor, { q: 'secret' }, TODAY),
    choices: await filterChoices(actor, TODAY),
    rewireable: await countRewireableByPatch(actor, TODAY),
    map: [
      await mapHomes(actor, { query: query(), box, zoom: 5 }, TODAY),
      await mapHomes(actor, { query: query(), box, zoom: 18 }, TODAY),
    ],
    today: await showToday(actor, TODAY),
    exported,
  }
}

const writes = (actor: Actor, homeId: string): [string, () => Promise<unknown>][] => [
  ['show', () => showHome(actor, homeId, TODAY)],
  [
    'record a fact',
    () =>
      recordFact(
        actor,
        { homeId, facts: [{ kind: 'bedrooms', value: '3', asOf: undefined, note: null }], seen: {} },
        TODAY,
      ),
  ],
  [
    'record an inspection',
    () => recordInspection(actor, RecordInspection.parse({ homeId, inspectedOn: '2024-01-01' }), TODAY),
  ],
  [
    'add a defect',
    () =>
      addDefect(actor, { homeId, code: 'C1', description: 'x', location: null, raisedOn: undefined }, TODAY),
  ],
  ['close a defect', () => closeDefect(actor, { homeId, defectId, closedOn: TODAY, note: 'x' }, TODAY)],
  [
    'change',
    () =>
      changeHome(
        actor,
        ChangeHome.parse({
          homeId,
          address: '9 New Street',
          nation: 'england',
          patch: actor.patches === 'all' ? '' : actor.patches[0],
        }),
        TODAY,
      ),
  ],
]

const registerOf = ({ organisationId }: AnOrganisation) =>
  pool()('home_register').where({ organisation_id: organisationId }).orderBy('home_id')

describe('another organisation', () => {
  it('sees nothing in any list, count, map, search or export', async () => {
    const seen = await everythingSeenBy(attacker.manager)
    expect(JSON.stringify(seen)).not.toMatch(/secret/i)
    expect(seen.list).toMatchObject({ rows: [], total: 0, all: 0 })
    expect(seen.byPatch.total).toBe(0)
    expect(seen.today).toMatchObject({ homes: 0, firstStep: 'import', worst: [], inDateShare: null })
    expect(seen.map).toEqual([
      { clusters: [], points: [], inBox: 0, placed: 0, unplaced: 0, extent: null },
      { clusters: [], points: [], inBox: 0, placed: 0, unplaced: 0, extent: null },
    ])
    expect(seen.exported).toEqual([])
  })

  it('is told for each act that the home was not found, as for one that never was, and changes nothing', async () => {
    const before = await registerOf(victim)
    const never = newId()
    for (const homeId of [inNorth, inSouth, inNone, never, 'no-id'])
      for (const [what, act] of writes(attacker.manager, homeId).slice(0, homeId === 'no-id' ? 1 : undefined))
        await expect(act(), what).rejects.toEqual(new NotFound('That home'))
    expect(await registerOf(victim)).toEqual(before)
  })

  it('cannot put its home into a patch of the victim', async () => {
    await expect(added(attacker, '5 Own Street', victim.patches.north)).rejects.toEqual(
      new NotFound('That patch'),
    )
  })

  it('may use the UPRN, reference and address of the victim’s homes', async () => {
    const form = (owner: AnOrganisation) =>
      addHome(
        owner.manager,
        AddHome.parse({
          address: '7 Same Street',
          postcode: 'ZX1 2AB',
          nation: 'england',
          uprn: '990000000007',
          reference: 'SAME',
        }),
        TODAY,
      )
    await form(victim)
    const { homeId } = await form(attacker)
    expect(homeId).toMatch(/^[0-9a-f-]{36}$/)
    await pool()('assessments').where({ home_id: homeId }).delete()
    for (const table of ['home_register', 'home_facts'])
      await pool()(table).where({ home_id: homeId }).delete()
    await pool()('homes').where({ id: homeId }).delete()
  })
})

describe('an officer of another patch', () => {
  it('sees the homes of their own patch alone, and counts and ranks them alone', async () => {
    const seen = await everythingSeenBy(victim.officer)
    expect(seen.list.rows.map((home) => home.id)).toEqual([inNorth])
    expect(seen.list).toMatchObject({ total: 1, all: 1 })
    expect(seen.byPatch.total).toBe(0)
    expect(seen.found.homes.map((home) => home.id)).toEqual([inNorth])
    expect(seen.choices).toMatchObject({
      patches: [{ id: victim.patches.north, homes: 1 }],
      inNoPatch: 0,
      blocks: [{ name: 'Secret House', homes: 1 }],
    })
    expect(seen.rewireable.totals).toEqual({ homes: 1, withRewireableWays: 1, unknown: 0 })
    for (const map of seen.map)
      expect(map).toMatchObject({ clusters: [], points: [{ id: inNorth }], inBox: 1, placed: 1 })
    expect(seen.today).toMatchObject({ homes: 1, danger: { withC2: 0, oldestC2: [] } })
    expect(seen.exported).toHaveLength(1)
    const shown = await showHome(victim.officer, inNorth, TODAY)
    expect(shown).toMatchObject({ rank: { place: 1, of: 1 }, neighbours: { homes: 0 } })
    expect((await showHome(victim.manager, inNorth, TODAY)).neighbours).toMatchObject({ homes: 2 })
  })

  it('is told that a home of another patch, or of none, was not found', async () => {
    const before = await registerOf(victim)
    for (const homeId of [inSouth, inNone])
      for (const [what, act] of writes(victim.officer, homeId))
        await expect(act(), what).rejects.toEqual(new NotFound('That home'))
    expect(await registerOf(victim)).toEqual(before)
  })

  it('cannot move a home out of sight', async () => {
    const change = (patch: string) =>
      changeHome(
        victim.officer,
        ChangeHome.parse({ homeId: inNorth, address: '1 Secret Street', nation: 'england', patch }),
        TODAY,
      )
    await expect(change(victim.patches.south)).rejects.toEqual(new NotFound('That patch'))
    await expect(change('')).rejects.toMatchObject({ kind: 'invalid', problems: [{ field: 'patch' }] })
  })

  it('sees nothing while they answer for no patch', async () => {
    const nobody: Actor = { ...victim.officer, patches: [] }
    const seen = await everythingSeenBy(nobody)
    expect(JSON.stringify(seen)).not.toMatch(/secret/i)
    expect(seen.today).toMatchObject({ homes: 0, firstStep: 'ask-for-a-patch' })
    await expect(showHome(nobody, inNorth, TODAY)).rejects.toEqual(new NotFound('That home'))
  })
})

describe('a role that may not', () => {
  it('is refused, and the auditor changes nothing', async () => {
    for (const [what, act] of writes(victim.auditor, inNorth).slice(1))
      await expect(act(), what).rejects.toEqual(new NotAllowed())
    await expect(
      addHome(victim.officer, AddHome.parse({ address: '8 New Street', nation: 'england' }), TODAY),
    ).rejects.toEqual(new NotAllowed())
    expect((await showHome(victim.auditor, inSouth, TODAY)).mayEdit).toBe(false)
    expect((await showHome(victim.manager, inSouth, TODAY)).mayEdit).toBe(true)
  })

  it.each(['supervisor', 'electrician'] as const)('sees no home: the %s', async (role) => {
    const actor = victim[role]
    for (const act of [
      () => listHomes(actor, query(), TODAY),
      () => findHomes(actor, { q: 'secret' }, TODAY),
      () => filterChoices(actor, TODAY),
      () => countRewireableByPatch(actor, TODAY),
      () => mapHomes(actor, { query: query(), box: [-10, 49, 4, 62], zoom: 5 }, TODAY),
      () => showToday(actor, TODAY),
      () => exportHomes(actor, query(), TODAY),
      () => showHome(actor, inNorth, TODAY),
    ])
      await expect(act()).rejects.toEqual(new NotAllowed())
  })

  it('leaves no entry on the audit trail', async () => {
    const before = await audit.count(reading(victim.manager))
    await exportHomes(victim.electrician, query(), TODAY).catch(() => undefined)
    await showHome(attacker.manager, inNorth, TODAY).catch(() => undefined)
    expect(await audit.count(reading(victim.manager))).toBe(before)
  })
})
