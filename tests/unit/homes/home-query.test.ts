import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  BOARD_FILTERS,
  COLUMNS,
  DUTIES,
  FIRST_COLUMNS,
  HomeQuery,
  homeQueryOf,
  homeQueryText,
  SORTS,
} from '@/lib/homes/home-query'
import { NATIONS } from '@/lib/homes/nation'
import { RCD_COVERS } from '@/lib/homes/rcd-cover'
import { STANDINGS } from '@/lib/homes/standing'
import { TENURES } from '@/lib/homes/tenure'
import { anyDay } from '../calendar/any-day'

/** What Next hands a page for a URL's search text: a repeated key becomes a list. */
function paramsOf(text: string): Record<string, string | string[]> {
  const params: Record<string, string | string[]> = Object.create(null) as Record<string, string | string[]>
  for (const [key, value] of new URLSearchParams(text)) {
    const before = params[key]
    params[key] = before === undefined ? value : [before, value].flat()
  }
  return params
}

const some = <T extends string>(values: readonly T[]) =>
  fc.uniqueArray(fc.constantFrom(...values), { maxLength: 5 })
const degrees = fc.double({ min: -180, max: 180, noNaN: true }).map((n) => (n === 0 ? 0 : n))
const text = fc.string({ maxLength: 60 }).map((typed) => typed.trim())
const year = fc.option(fc.integer({ min: 1000, max: 2100 }), { nil: undefined })
const day = fc.option(anyDay, { nil: undefined })
const uuid = fc.uuid({ version: [4, 7] })

const anyQuery: fc.Arbitrary<HomeQuery> = fc.record({
  search: text,
  patch: fc.uniqueArray(fc.oneof(uuid, fc.constant('none' as const)), { maxLength: 3 }),
  block: fc.uniqueArray(uuid, { maxLength: 3 }),
  board: some(BOARD_FILTERS),
  cover: some(RCD_COVERS),
  standing: some(STANDINGS),
  tenure: some(TENURES),
  nation: some(NATIONS),
  duty: some(DUTIES),
  defects: some(['C1', 'C2', 'C3', 'FI', 'any'] as const),
  builtFrom: year,
  builtTo: year,
  dueFrom: day,
  dueTo: day,
  within: fc.option(fc.tuple(degrees, degrees, degrees, degrees), { nil: undefined }),
  sort: fc.constantFrom(...SORTS),
  order: fc.constantFrom('asc' as const, 'desc' as const),
  columns: fc.uniqueArray(fc.constantFrom(...COLUMNS), { minLength: 1, maxLength: COLUMNS.length }),
  after: fc.option(fc.string({ minLength: 1, maxLength: 60 }), { nil: undefined }),
})

describe('a homes query in a URL', () => {
  it('comes back as it went', () => {
    fc.assert(
      fc.property(anyQuery, (query) => {
        expect(homeQueryOf(paramsOf(homeQueryText(query)))).toEqual(HomeQuery.parse(query))
      }),
      { numRuns: 300 },
    )
  })

  it('holds only what is not at its default', () => {
    expect(homeQueryText(homeQueryOf({}))).toBe('')
    expect(homeQueryText({ ...homeQueryOf({}), search: 'herring' })).toBe('search=herring')
    expect(homeQueryText(homeQueryOf({ board: 'rewireable-ways', sort: 'due', order: 'asc' }))).toBe(
      'sort=due&order=asc&board=rewireable-ways',
    )
  })

  it('reads lists with commas and repeated keys alike, each value once', () => {
    expect(homeQueryOf({ board: 'mixed,rewireable' }).board).toEqual(['mixed', 'rewireable'])
    expect(homeQueryOf({ board: ['mixed', 'rewireable', 'mixed'] }).board).toEqual(['mixed', 'rewireable'])
    expect(homeQueryOf({ standing: 'never inspected,lapsed' }).standing).toEqual([
      'never inspected',
      'lapsed',
    ])
  })
})

describe('a URL that nobody here wrote', () => {
  const plain = homeQueryOf({})

  it.each([
    [{ sort: 'score; drop table homes' }],
    [{ order: 'ASC' }],
    [{ board: 'fuses' }],
    [{ patch: '../../etc/passwd' }],
    [{ block: 'none' }],
    [{ builtFrom: '12' }],
    [{ builtTo: '1931.5' }],
    [{ builtFrom: 'NaN' }],
    [{ builtFrom: ' ' }],
    [{ dueFrom: '2026-02-30' }],
    [{ dueTo: '01/12/2026' }],
    [{ within: '1,2,3' }],
    [{ within: '1,2,3,x' }],
    [{ within: 'Infinity,0,0,0' }],
    [{ within: ',,,' }],
    [{ columns: 'password' }],
    [{ columns: '' }],
    [{ after: 'x'.repeat(401) }],
    [{ search: 'x'.repeat(121) }],
    [{ unheardOf: '1' }],
    [{ sort: ['', 'due'] }],
    [{ board: [] }],
    [{ search: undefined }],
  ])('%j changes nothing', (params) => {
    expect(homeQueryOf(params)).toEqual(plain)
  })

  it('keeps what is understood beside what is not', () => {
    expect(
      homeQueryOf({ board: 'mixed,fuses', columns: 'score,password', builtFrom: '1900', builtTo: 'x' }),
    ).toEqual({
      ...plain,
      board: ['mixed'],
      columns: ['score'],
      builtFrom: 1900,
    })
    expect(plain.columns).toEqual(FIRST_COLUMNS)
  })

  it('never makes a fault, and settles after one reading', () => {
    const hostile = fc.oneof(
      fc.string({ unit: 'binary', maxLength: 200 }),
      fc.array(fc.string(), { maxLength: 4 }),
    )
    const keys = fc.constantFrom(...Object.keys(HomeQuery.shape), '__proto__', 'constructor', 'toString')
    fc.assert(
      fc.property(fc.dictionary(keys, hostile), (params) => {
        const query = homeQueryOf(params)
        expect(HomeQuery.safeParse(query).success).toBe(true)
        const settled = homeQueryOf(paramsOf(homeQueryText(query)))
        expect(homeQueryOf(paramsOf(homeQueryText(settled)))).toEqual(settled)
      }),
      { numRuns: 300 },
    )
  })
})
