import { beforeAll, describe, expect, it } from 'vitest'
import { inTransaction, reading } from '@/db/connection'
import { pool } from '@/db/knex'
import * as homes from '@/db/repositories/homes'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { assess } from '@/lib/risk/assess'
import { FIRST_METHOD } from '@/lib/risk/first-method'
import { refreshHomes } from '@/lib/use-cases/homes/refresh-homes'
import { rescoreOrganisation } from '@/lib/use-cases/homes/rescore-organisation'
import { showHome } from '@/lib/use-cases/homes/show-home'
import { loadHomes } from '@/tests/bench/load-homes'
import { anOrganisation, type AnOrganisation } from '@/tests/builders/an-organisation'
import { countingStatements } from './counting-statements'
import { TODAY } from './some-homes'

let organisation: AnOrganisation
let other: AnOrganisation

beforeAll(async () => {
  organisation = await anOrganisation()
  other = await anOrganisation()
  await loadHomes(organisation, 1_150)
  await loadHomes(other, 20, { seed: 2 })
})

const ofOrganisation = (table: string, { organisationId }: AnOrganisation = organisation) =>
  pool()(table).where({ organisation_id: organisationId })
const register = () =>
  ofOrganisation('home_register')
    .orderBy('home_id')
    .select('home_id', 'score', 'score_low', 'score_high', 'due_on', 'board_type')
const current = () =>
  ofOrganisation('assessments')
    .where({ is_current: true })
    .orderBy('home_id')
    .select('home_id', 'id', 'score')

describe('scoring an organisation anew', () => {
  it('gives each home its row and its assessment, tells how far it is, and leaves other organisations alone', async () => {
    const told: [number, number][] = []
    await rescoreOrganisation(organisation, TODAY, async (done, total) => void told.push([done, total]))
    expect(told).toEqual([
      [1_000, 1_150],
      [1_150, 1_150],
    ])
    const [rows, scores] = [await register(), await current()]
    expect(rows).toHaveLength(1_150)
    expect(scores.map(({ home_id, score }) => [home_id, score])).toEqual(
      rows.map(({ home_id, score }) => [home_id, score]),
    )
    expect(await ofOrganisation('home_register', other)).toEqual([])
  })

  it('again on the same day changes nothing', async () => {
    const before = [await register(), await current(), await ofOrganisation('assessments').count()]
    await rescoreOrganisation(organisation, TODAY)
    expect([await register(), await current(), await ofOrganisation('assessments').count()]).toEqual(before)
  })

  it('scores by the facts on record: the explanation kept is the one that the method gives now', async () => {
    for (const { home_id } of (await register()).slice(0, 25)) {
      const { home, assessment } = await showHome(organisation.manager, home_id, TODAY)
      expect(assessment).toEqual(assess(home, FIRST_METHOD, TODAY))
      const kept = [assessment?.score, assessment?.low, assessment?.high].map((score) =>
        Number(score?.toFixed(4)),
      )
      expect([home.score, home.scoreLow, home.scoreHigh]).toEqual(kept)
    }
  })

  it('on another day of the month follows time within the same row, and keeps one a month', async () => {
    const before = await current()
    await rescoreOrganisation(organisation, calendarDay('2026-12-31'))
    const later = await current()
    expect(later.map(({ id }) => id)).toEqual(before.map(({ id }) => id))
    expect(later.filter(({ score }, at) => score !== before[at]?.score).length).toBeGreaterThan(100)

    await rescoreOrganisation(organisation, calendarDay('2027-01-04'))
    const nextMonth = await current()
    const moved = nextMonth.filter(({ id }, at) => id !== later[at]?.id)
    expect(moved.length).toBeGreaterThan(100)
    expect(Number((await ofOrganisation('assessments').count({ rows: '*' }))[0]?.rows)).toBe(
      1_150 + moved.length,
    )
    const { scoreHistory, assessment } = await showHome(organisation.manager, moved[0]?.home_id ?? '', TODAY)
    expect(scoreHistory.map(({ on }) => on)).toEqual(['2026-12-01', '2027-01-04'])
    expect(Number(assessment?.score.toFixed(4))).toBe(scoreHistory.at(-1)?.score)
    await rescoreOrganisation(organisation, TODAY)
  })
})

describe('refreshing homes', () => {
  it('passes over homes of another organisation', async () => {
    const ids = await homes.listIdsAfter(reading(other), null, 5)
    await inTransaction(organisation, (scope) => refreshHomes(scope, ids, TODAY))
    expect(await ofOrganisation('home_register', other)).toEqual([])
    expect(await ofOrganisation('home_register').whereIn('home_id', ids)).toEqual([])
  })

  it('takes few statements, however many homes', async () => {
    const ids = await homes.listIdsAfter(reading(organisation), null, 1_000)
    const { statements } = await countingStatements(() =>
      inTransaction(organisation, (scope) => refreshHomes(scope, ids, calendarDay('2027-02-01'))),
    )
    expect(statements.length).toBeLessThanOrEqual(14)
  })

  it('of none does nothing', async () => {
    const { statements } = await countingStatements(() =>
      inTransaction(organisation, (scope) => refreshHomes(scope, [], TODAY)),
    )
    expect(statements.filter((sql) => !/^(begin|commit|set transaction)/i.test(sql))).toEqual([])
  })

  it('is undone with the change that it belongs to', async () => {
    const before = [await register(), await current()]
    const ids = await homes.listIdsAfter(reading(organisation), null, 3)
    const failing = inTransaction(organisation, async (scope) => {
      await homes.update(scope, ids[0] ?? '', { nation: 'wales' })
      await refreshHomes(scope, ids, calendarDay('2029-01-01'))
      throw new Error('and then the power went')
    })
    await expect(failing).rejects.toThrow('and then the power went')
    expect([await register(), await current()]).toEqual(before)
  })
})
