/** Adding and changing homes by the forms, and the page of one. */
import { beforeEach, describe, expect, it } from 'vitest'
import { type z } from 'zod'
import { reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import { Invalid } from '@/lib/errors/expected'
import { problemsOf } from '@/lib/forms/problems-of'
import { homeQueryOf } from '@/lib/homes/home-query'
import { AddHome, addHome } from '@/lib/use-cases/homes/add-home'
import { ChangeHome, changeHome } from '@/lib/use-cases/homes/change-home'
import { listHomes } from '@/lib/use-cases/homes/list-homes'
import { showHome } from '@/lib/use-cases/homes/show-home'
import { anOrganisation, type AnOrganisation } from '@/tests/builders/an-organisation'
import { countingStatements } from './counting-statements'
import { TODAY } from './some-homes'

let organisation: AnOrganisation

beforeEach(async () => {
  organisation = await anOrganisation()
})

const LEAST = { address: '1 Herring Row', postcode: 'ZX1 2AB', nation: 'england' }
const add = (given: Record<string, string> = {}) =>
  addHome(organisation.manager, AddHome.parse({ ...LEAST, ...given }), TODAY)
const shown = (homeId: string) => showHome(organisation.manager, homeId, TODAY)
const fieldsOf = (act: Promise<unknown>) =>
  act.then(
    () => 'no problem',
    (thrown: unknown) => (thrown instanceof Invalid ? thrown.problems.map((one) => one.field) : thrown),
  )
const problems = (schema: z.ZodType, given: unknown) => {
  const { error } = schema.safeParse(given)
  return error ? problemsOf(error) : []
}
const lastAct = async () => (await audit.list(reading(organisation.manager), { limit: 1 }))[0]

describe('adding a home', () => {
  it('takes an address alone, and everything else is not known', async () => {
    const { homeId } = await add()
    const { home, assessment, standing, facts } = await shown(homeId)
    expect(home).toMatchObject({
      boardType: 'unknown',
      rcdCover: 'unknown',
      standing: 'unknown date',
      dueOn: null,
      tenure: 'unknown',
    })
    expect(facts.every((fact) => fact.current === null && fact.before.length === 0)).toBe(true)
    expect(assessment?.unknowns).toEqual(
      expect.arrayContaining(['board-type', 'rcd-cover', 'wiring', 'built', 'inspection']),
    )
    expect(home.scoreLow).toBeLessThan(home.scoreHigh)
    expect(standing.reason).toMatch(/not known.*SI 2020\/312/)
    expect((await listHomes(organisation.manager, homeQueryOf({}), TODAY)).rows.map((row) => row.id)).toEqual(
      [homeId],
    )
    expect(await lastAct()).toMatchObject({
      did: 'home.added',
      subjectId: homeId,
      actorId: organisation.manager.personId,
    })
  })

  it('counts the due date from the last inspection by the law of its nation', async () => {
    const dated = { 'inspectedOn-day': '14', 'inspectedOn-month': '3', 'inspectedOn-year': '2022' }
    const english = await shown((await add({ ...dated, address: '2 Herring Row' })).homeId)
    const welsh = await shown((await add({ ...dated, address: '3 Herring Row', nation: 'wales' })).homeId)
    // SI 2020/312 reg 3(2): to the fifth anniversary; WSI 2022/6 reg 6(2)(b): five years beginning with the day
    expect([english.home.dueOn, welsh.home.dueOn]).toEqual(['2027-03-14', '2027-03-13'])
    expect(english.standing).toMatchObject({
      decidedBy: 'law',
      citation: 'SI 2020/312, reg 3(2)',
      isOwed: true,
    })
  })

  it('sets type and cover by the ways', async () => {
    const { home } = await shown((await add({ ways: '[BBBB]' })).homeId)
    expect(home).toMatchObject({ boardType: 'breakers', rcdCover: 'all', ways: '[BBBB]' })
  })

  it.each<[Record<string, string>, string[]]>([
    [{ 'inspectedOn-day': '2', 'inspectedOn-month': '12', 'inspectedOn-year': '2026' }, ['inspectedOn']],
    [{ 'inspectedOn-year': '2020', 'inspection-record': 'never' }, ['inspectedOn']],
    [{ 'nextDueOn-day': '1', 'nextDueOn-month': '1', 'nextDueOn-year': '2027' }, ['nextDueOn']],
    [{ latitude: '53.4' }, ['longitude']],
    [{ 'board-type': 'breakers', ways: 'RRRR' }, ['board-type']],
    [{ bedrooms: 'many', wiring: 'wool' }, ['wiring', 'bedrooms']],
  ])('refuses %j', async (given, fields) => {
    expect(await fieldsOf(add(given))).toEqual(fields)
    expect((await listHomes(organisation.manager, homeQueryOf({}), TODAY)).total).toBe(0)
  })

  it('says in plain words what is wrong with a field', () => {
    const wrong = {
      address: ' ',
      postcode: 'ZXI 2AB',
      uprn: '12a',
      nation: 'france',
      latitude: 'north',
      patch: 'x',
    }
    expect(problems(AddHome, wrong)).toEqual([
      { field: 'address', problem: 'Write the first lines of the address, such as 12 Herring Row.' },
      {
        field: 'postcode',
        problem:
          'That is not a postcode. One looks like ZX1 2AB; take care with the letter O and the figure 0.',
      },
      {
        field: 'uprn',
        problem:
          'That is not a UPRN: it is a number of up to 12 figures. Leave it empty if you do not have it.',
      },
      { field: 'nation', problem: 'Choose the nation that the home is in: its law sets the inspection.' },
      { field: 'patch', problem: 'Choose a patch from the list.' },
      { field: 'latitude', problem: 'Write the latitude in degrees, such as 55.500.' },
    ])
  })

  it('takes a home once, however it is spelt, and a UPRN and a reference once', async () => {
    await add({ uprn: '990012345678', reference: 'QH-1' })
    expect(await fieldsOf(add({ address: '1, Herring  row' }))).toEqual(['address'])
    expect(
      await fieldsOf(add({ address: '2 Herring Row', uprn: '0990012345678'.slice(1), reference: 'qh-1' })),
    ).toEqual(['uprn', 'reference'])
    const twice = await Promise.allSettled([
      add({ address: '9 Herring Row' }),
      add({ address: '9 Herring Row' }),
    ])
    expect(twice.map(({ status }) => status).toSorted()).toEqual(['fulfilled', 'rejected'])
  })
})

describe('changing a home', () => {
  it('moves it in lists, search and law at once, and tells the trail what, without the address', async () => {
    const { homeId } = await add({
      'inspectedOn-day': '14',
      'inspectedOn-month': '3',
      'inspectedOn-year': '2022',
      patch: organisation.patches.north,
    })
    const form = {
      homeId,
      address: '8 Copper Lane',
      postcode: 'yx4 5ef',
      nation: 'wales',
      tenure: 'social-rent',
      patch: organisation.patches.south,
      block: 'Copper House',
      note: 'Key at the office',
    }
    expect(
      (await changeHome(organisation.manager, ChangeHome.parse(form), TODAY)).changed.toSorted(),
    ).toEqual(['address', 'blockId', 'nation', 'note', 'patchId', 'postcode', 'tenure'])
    const { home, note } = await shown(homeId)
    expect(home).toMatchObject({
      address: '8 Copper Lane',
      postcode: 'YX4 5EF',
      dueOn: '2027-03-13',
      patch: { name: 'South' },
      block: { name: 'Copper House' },
    })
    expect(note).toBe('Key at the office')
    const found = async (search: string) =>
      (await listHomes(organisation.manager, { ...homeQueryOf({}), search }, TODAY)).total
    expect([await found('copper yx45ef'), await found('herring')]).toEqual([1, 0])
    const entry = await lastAct()
    expect(entry).toMatchObject({ did: 'home.changed', detail: { nation: { from: 'england', to: 'wales' } } })
    expect(JSON.stringify(entry?.detail)).not.toMatch(/Copper|Key/)
  })

  it('that changes nothing leaves no trace', async () => {
    const { homeId } = await add()
    const before = await audit.count(reading(organisation.manager))
    expect(await changeHome(organisation.manager, ChangeHome.parse({ ...LEAST, homeId }), TODAY)).toEqual({
      changed: [],
    })
    expect(await audit.count(reading(organisation.manager))).toBe(before)
  })

  it('cannot take what another home has', async () => {
    await add({ uprn: '990012345678' })
    const { homeId } = await add({ address: '2 Herring Row' })
    expect(
      await fieldsOf(
        changeHome(organisation.manager, ChangeHome.parse({ ...LEAST, homeId, uprn: '990012345678' }), TODAY),
      ),
    ).toEqual(['uprn', 'address'])
  })
})

describe('a home’s page', () => {
  it('takes ten statements at most', async () => {
    const { homeId } = await add({ block: 'Herring House', 'board-type': 'rewireable' })
    const { statements } = await countingStatements(() => shown(homeId))
    expect(statements.length).toBeLessThanOrEqual(10)
  })

  it('ranks the home by its score, ties alike', async () => {
    const worst = (
      await add({
        address: '2 Herring Row',
        'board-type': 'rewireable',
        'rcd-cover': 'none',
        wiring: 'rubber',
        'inspection-record': 'never',
      })
    ).homeId
    const one = (
      await add({
        address: '3 Herring Row',
        'board-type': 'rcbo',
        'rcd-cover': 'all',
        wiring: 'pvc',
        'inspectedOn-year': '2026',
      })
    ).homeId
    const other = (
      await add({
        address: '4 Herring Row',
        'board-type': 'rcbo',
        'rcd-cover': 'all',
        wiring: 'pvc',
        'inspectedOn-year': '2026',
      })
    ).homeId
    expect((await Promise.all([worst, one, other].map(shown))).map(({ rank }) => rank)).toEqual([
      { place: 1, of: 3 },
      { place: 2, of: 3 },
      { place: 2, of: 3 },
    ])
  })
})
