/** The list's filter in SQL against the same filter written out in plain code. */
import fc from 'fast-check'
import { beforeAll, describe, expect, it } from 'vitest'
import { reading } from '@/db/connection'
import * as homeList from '@/db/repositories/home-list'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { BOARD_FILTERS, DUTIES, HomeQuery, homeQueryOf } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { RCD_COVERS } from '@/lib/homes/rcd-cover'
import { STANDINGS } from '@/lib/homes/standing'
import { isInScope, TENURES } from '@/lib/homes/tenure'
import { filterFor } from '@/lib/use-cases/homes/filter-for'
import { listHomes } from '@/lib/use-cases/homes/list-homes'
import { type AnOrganisation } from '@/tests/builders/an-organisation'
import { everyHome, NOTICE_DAYS, someHomes, TODAY } from './some-homes'

let organisation: AnOrganisation
let every: HomeRow[]

beforeAll(async () => {
  organisation = await someHomes(300, 7)
  every = await everyHome(organisation)
})

const has = <T>(chosen: readonly T[], value: T) => chosen.length === 0 || chosen.includes(value)

function boardIs(home: HomeRow, chosen: HomeQuery['board']): boolean {
  if (chosen.length === 0) return true
  return chosen.some((board) =>
    board === 'rewireable-ways' ? ['rewireable', 'mixed'].includes(home.boardType) : board === home.boardType,
  )
}

function couldBeBuilt({ built }: HomeRow, from?: number, to?: number): boolean {
  if (from === undefined && to === undefined) return true
  if (built.from === null && built.to === null) return false
  return (built.to ?? 9999) >= (from ?? 0) && (built.from ?? 0) <= (to ?? 9999)
}

const dueBetween = (dueOn: CalendarDay | null, from?: string, to?: string) =>
  (from === undefined || (dueOn !== null && dueOn >= from)) &&
  (to === undefined || (dueOn !== null && dueOn <= to))

function isWithin({ place }: HomeRow, within: HomeQuery['within']): boolean {
  if (!within) return true
  const [west, south, east, north] = within
  return (
    place !== null &&
    place.longitude >= west &&
    place.longitude <= east &&
    place.latitude >= south &&
    place.latitude <= north
  )
}

const letsThrough = (home: HomeRow, query: HomeQuery): boolean =>
  has<string>(query.patch, home.patch?.id ?? 'none') &&
  (query.block.length === 0 || (home.block !== null && query.block.includes(home.block.id))) &&
  boardIs(home, query.board) &&
  has(query.cover, home.rcdCover) &&
  has(query.standing, home.standing) &&
  has(query.tenure, home.tenure) &&
  has(query.nation, home.nation) &&
  has(query.duty, isInScope(home.tenure) ? 'owed' : 'not-owed') &&
  (query.defects.length === 0 ||
    query.defects.some((code) =>
      code === 'any' ? Object.values(home.open).some((open) => open > 0) : home.open[code] > 0,
    )) &&
  couldBeBuilt(home, query.builtFrom, query.builtTo) &&
  dueBetween(home.dueOn, query.dueFrom, query.dueTo) &&
  isWithin(home, query.within)

const some = <T>(values: readonly T[]) =>
  fc.oneof(
    { weight: 5, arbitrary: fc.constant<T[]>([]) },
    { weight: 1, arbitrary: fc.subarray([...values], { maxLength: Math.min(3, values.length) }) },
  )
const day = fc
  .date({ min: new Date('2020-01-01'), max: new Date('2033-01-01'), noInvalidDate: true })
  .map((date) => date.toISOString().slice(0, 10))
const maybe = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: undefined, freq: 2 })

const aQuery = () => {
  const ids = (of: (home: HomeRow) => string | undefined) => [
    ...new Set(every.flatMap((home) => of(home) ?? [])),
  ]
  return fc.record({
    patch: some([...ids((home) => home.patch?.id), 'none' as const]),
    block: some(ids((home) => home.block?.id)),
    board: some(BOARD_FILTERS),
    cover: some(RCD_COVERS),
    standing: some(STANDINGS),
    tenure: some(TENURES),
    duty: some(DUTIES),
    defects: some(['C1', 'C2', 'C3', 'FI', 'any'] as const),
    builtFrom: maybe(fc.integer({ min: 1880, max: 2020 })),
    builtTo: maybe(fc.integer({ min: 1880, max: 2020 })),
    dueFrom: maybe(day),
    dueTo: maybe(day),
    within: maybe(
      fc.constantFrom<[number, number, number, number]>(
        [0.9, 53.4, 0.91, 53.41],
        [0.905, 53.401, 0.905, 53.402],
        [-1, 50, 2, 55],
      ),
    ),
  })
}

describe('the filter', () => {
  it('lets the same homes through as plain code does', async () => {
    let found = 0
    await fc.assert(
      fc.asyncProperty(aQuery(), async (given) => {
        const query = HomeQuery.parse(given)
        const filter = filterFor(organisation.manager, query, TODAY, NOTICE_DAYS)
        const places = await homeList.listPlaces(
          reading(organisation.manager),
          filter,
          { sort: 'due', order: 'asc' },
          null,
          1_000,
        )
        const wanted = every.filter((home) => letsThrough(home, query)).map((home) => home.id)
        expect(places.map((place) => place.id).toSorted()).toEqual(wanted.toSorted())
        expect(await homeList.count(reading(organisation.manager), filter)).toBe(wanted.length)
        found += wanted.length
      }),
      { numRuns: 150, seed: 1 },
    )
    expect(found).toBeGreaterThan(1_000)
  })

  it('finds every standing, and counts each home in one of them', async () => {
    const totals = await Promise.all(
      STANDINGS.map(
        async (standing) =>
          (await listHomes(organisation.manager, { ...homeQueryOf({}), standing: [standing] }, TODAY)).total,
      ),
    )
    expect(totals.every((total) => total > 0)).toBe(true)
    expect(totals.reduce((sum, total) => sum + total, 0)).toBe(every.length)
  })
})
