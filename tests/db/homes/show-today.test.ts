/** Today, and the counts by patch, against the homes themselves. */
import { beforeAll, describe, expect, it } from 'vitest'
import { pool } from '@/db/knex'
import { mondayOf } from '@/lib/calendar/week-of'
import { type HomeRow } from '@/lib/homes/home-row'
import { STANDINGS } from '@/lib/homes/standing'
import { isInScope } from '@/lib/homes/tenure'
import { countRewireableByPatch } from '@/lib/use-cases/homes/count-rewireable'
import { filterChoices } from '@/lib/use-cases/homes/filter-choices'
import { showToday } from '@/lib/use-cases/today/show-today'
import { anOrganisation, type AnOrganisation } from '@/tests/builders/an-organisation'
import { countingStatements } from './counting-statements'
import { everyHome, NOTICE_DAYS, someHomes, TODAY } from './some-homes'

let organisation: AnOrganisation
let every: HomeRow[]

beforeAll(async () => {
  organisation = await someHomes(1_300, 3)
  const { organisationId: organisation_id } = organisation
  const ids = (await pool()('homes').where({ organisation_id }).limit(7).pluck('id')) as string[]
  for (const table of ['homes', 'home_register'])
    await pool()(table)
      .where({ organisation_id })
      .whereIn(table === 'homes' ? 'id' : 'home_id', ids)
      .update({ latitude: null, longitude: null })
  every = await everyHome(organisation)
})

const count = (is: (home: HomeRow) => boolean) => every.filter(is).length
/** On a long lease the landlord owes no inspection. */
const isOwed = (home: HomeRow) => isInScope(home.tenure)
const isRewireable = (home: HomeRow) => home.boardType === 'rewireable' || home.boardType === 'mixed'

describe('today', () => {
  it('counts what is so, in ten statements at most', async () => {
    const { result: today, statements } = await countingStatements(() =>
      showToday(organisation.manager, TODAY),
    )
    expect(statements.length).toBeLessThanOrEqual(10)
    expect(today.standing).toEqual({
      homes: count(isOwed),
      notOwed: 1_300 - count(isOwed),
      ...Object.fromEntries(
        STANDINGS.map((standing) => [standing, count((home) => isOwed(home) && home.standing === standing)]),
      ),
    })
    expect(today.inDateShare).toBe(
      count((home) => isOwed(home) && (home.standing === 'in date' || home.standing === 'due')) /
        count(isOwed),
    )
    expect(today.danger).toMatchObject({
      withC1: count((home) => home.open.C1 > 0),
      withC2: count((home) => home.open.C2 > 0),
    })
    expect(today.rewireable).toMatchObject({
      withRewireableWays: count(isRewireable),
      unknown: count((home) => home.boardType === 'unknown'),
    })
    expect(today).toMatchObject({ homes: 1_300, noticeDays: NOTICE_DAYS, firstStep: null })
  })

  it('draws the due line from a quarter back to a year on', async () => {
    const { weeks } = await showToday(organisation.manager, TODAY)
    expect(weeks).toHaveLength(66)
    expect(weeks[13]).toMatchObject({ monday: '2026-11-30', past: false })
    for (const week of weeks)
      expect(week.homes).toBe(
        count((home) => isOwed(home) && home.dueOn !== null && mondayOf(home.dueOn) === week.monday),
      )
    expect(weeks.some((week) => week.homes > 0)).toBe(true)
  })

  it('shows the worst first', async () => {
    const { worst, danger } = await showToday(organisation.manager, TODAY)
    const highest = every.map((home) => home.score).toSorted((a, b) => b - a)
    expect(worst.map((home) => home.score)).toEqual(highest.slice(0, 8))
    expect(danger.worstC1.every((home) => home.open.C1 > 0)).toBe(true)
    expect(danger.worstC1).toHaveLength(Math.min(10, danger.withC1))
    expect(danger.oldestC2).toHaveLength(5)
    expect(danger.oldestC2.every(({ home }) => home.open.C2 > 0)).toBe(true)
    const days = danger.oldestC2.map(({ raisedOn }) => raisedOn ?? '')
    expect(days).toEqual(days.toSorted())
  })

  it('tells an empty organisation what to do first', async () => {
    const { manager, officer, auditor } = await anOrganisation()
    expect(await showToday(manager, TODAY)).toMatchObject({
      homes: 0,
      firstStep: 'import',
      inDateShare: null,
    })
    expect((await showToday(officer, TODAY)).firstStep).toBe('ask-a-manager')
    expect((await showToday(auditor, TODAY)).firstStep).toBe('ask-a-manager')
  })
})

describe('the homes with rewireable fuses', () => {
  it('are counted by patch, with those that may have some apart', async () => {
    const { patches, totals } = await countRewireableByPatch(organisation.manager, TODAY)
    expect(totals).toEqual({
      homes: 1_300,
      withRewireableWays: count(isRewireable),
      unknown: count((home) => home.boardType === 'unknown'),
    })
    for (const { patch, homes, withRewireableWays, unknown } of patches) {
      const inPatch = (home: HomeRow) => home.patch?.id === patch?.id
      expect(homes).toBe(count(inPatch))
      expect(withRewireableWays).toBe(count((home) => inPatch(home) && isRewireable(home)))
      expect(unknown).toBe(count((home) => inPatch(home) && home.boardType === 'unknown'))
    }
    const names = patches.flatMap(({ patch }) => patch?.name ?? [])
    expect(names).toEqual(names.toSorted())
    const choices = await filterChoices(organisation.manager, TODAY)
    expect(choices.patches.reduce((sum, patch) => sum + patch.homes, choices.inNoPatch)).toBe(1_300)
    expect(choices.blocks.reduce((sum, block) => sum + block.homes, 0)).toBe(
      count((home) => home.block !== null),
    )
  })
})
