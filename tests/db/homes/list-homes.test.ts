import { beforeAll, describe, expect, it } from 'vitest'
import { type Actor } from '@/lib/access/actor'
import { type HomeQuery, homeQueryOf, SORTS } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { HOMES_A_PAGE, type HomeList, listHomes } from '@/lib/use-cases/homes/list-homes'
import { type AnOrganisation } from '@/tests/builders/an-organisation'
import { countingStatements } from './counting-statements'
import { everyHome, someHomes, TODAY } from './some-homes'

let organisation: AnOrganisation
let every: HomeRow[]

beforeAll(async () => {
  organisation = await someHomes(330)
  every = await everyHome(organisation)
})

const query = (given: Partial<HomeQuery> = {}): HomeQuery => ({ ...homeQueryOf({}), ...given })

async function everyPage(actor: Actor, asked: HomeQuery): Promise<HomeList[]> {
  const pages: HomeList[] = []
  let after: string | undefined
  do {
    const page = await listHomes(actor, { ...asked, after }, TODAY)
    pages.push(page)
    after = page.next ?? undefined
  } while (after !== undefined && pages.length < 100)
  return pages
}

const VALUE: Record<HomeQuery['sort'], (home: HomeRow) => string | number | null> = {
  score: (home) => home.score,
  address: () => '',
  due: (home) => home.dueOn,
  built: (home) => home.built.from ?? home.built.to,
  inspected: (home) => home.inspectedOn?.day ?? null,
}

describe('pages of the list', () => {
  it('has ties and gaps to be tested with', () => {
    expect(new Set(every.map((home) => home.score)).size).toBeLessThan(every.length / 2)
    for (const sort of ['due', 'built', 'inspected'] as const)
      expect(every.filter((home) => VALUE[sort](home) === null).length).toBeGreaterThan(2)
  })

  it.each(SORTS.flatMap((sort) => (['asc', 'desc'] as const).map((order) => [sort, order] as const)))(
    'hold each home once, by %s %s, what is not known last',
    async (sort, order) => {
      const pages = await everyPage(organisation.manager, query({ sort, order }))
      const rows = pages.flatMap((page) => page.rows)
      expect(rows.map((home) => home.id).toSorted()).toEqual(every.map((home) => home.id).toSorted())
      expect(pages.map((page) => page.rows.length)).toEqual([50, 50, 50, 50, 50, 50, 30])
      expect(pages.every((page) => page.total === 330 && page.all === 330)).toBe(true)

      const values = rows.map(VALUE[sort])
      const known = values.filter((value) => value !== null)
      expect(values.slice(known.length).every((value) => value === null)).toBe(true)
      const sorted = known.toSorted((a, b) => (a < b ? -1 : a > b ? 1 : 0))
      expect(known).toEqual(order === 'asc' ? sorted : sorted.toReversed())
    },
  )

  it('turn round when the order turns round', async () => {
    for (const sort of ['score', 'address'] as const) {
      const [up, down] = await Promise.all(
        (['asc', 'desc'] as const).map(async (order) =>
          (await everyPage(organisation.manager, query({ sort, order }))).flatMap((page) =>
            page.rows.map((home) => home.id),
          ),
        ),
      )
      expect(up).toEqual(down?.toReversed())
    }
  })

  it('hold each matching home once under a filter too', async () => {
    const asked = query({ board: ['rewireable-ways'], sort: 'built', order: 'asc' })
    const rows = (await everyPage(organisation.manager, asked)).flatMap((page) => page.rows)
    const wanted = every.filter((home) => home.boardType === 'rewireable' || home.boardType === 'mixed')
    expect(rows.map((home) => home.id).toSorted()).toEqual(wanted.map((home) => home.id).toSorted())
    expect(rows.length).toBeGreaterThan(HOMES_A_PAGE)
  })

  it('keep a street together, and its numbers in order', async () => {
    const rows = (await everyPage(organisation.manager, query({ sort: 'address', order: 'asc' }))).flatMap(
      (page) => page.rows,
    )
    const lantern = rows
      .filter((home) => home.address.endsWith(' Lantern Row'))
      .map((home) => Number.parseInt(home.address))
    expect(lantern).toEqual(lantern.toSorted((a, b) => a - b))
    expect(lantern.length).toBe(160)
  })

  it.each([
    ['no base64', '%%%'],
    ['no JSON', Buffer.from('nothing').toString('base64url')],
    ['another shape', Buffer.from('{"id":1}').toString('base64url')],
    ['no id', Buffer.from('["score","desc",1,"x"]').toString('base64url')],
    [
      'a text where a number belongs',
      Buffer.from('["score","desc","1","0193f2a0-7b3a-7c11-8d5e-000000000001"]').toString('base64url'),
    ],
    [
      'nothing where a score belongs',
      Buffer.from('["score","desc",null,"0193f2a0-7b3a-7c11-8d5e-000000000001"]').toString('base64url'),
    ],
  ])('begin with the first where the cursor is %s', async (_, after) => {
    const [first, other] = await Promise.all([
      listHomes(organisation.manager, query(), TODAY),
      listHomes(organisation.manager, query({ after }), TODAY),
    ])
    expect(other).toEqual(first)
  })

  it('begin with the first where the cursor belongs to another order', async () => {
    const { next } = await listHomes(organisation.manager, query({ sort: 'due' }), TODAY)
    const [first, other] = await Promise.all([
      listHomes(organisation.manager, query(), TODAY),
      listHomes(organisation.manager, query({ after: next ?? '' }), TODAY),
    ])
    expect(other).toEqual(first)
  })

  it('give cursors that the URL may carry', async () => {
    for (const sort of SORTS) {
      const { next } = await listHomes(organisation.manager, query({ sort }), TODAY)
      expect(homeQueryOf({ after: next ?? '' }).after).toBe(next)
    }
  })

  it('count apart the homes whose board is not known', async () => {
    const north = query({ board: ['rewireable-ways'], patch: [organisation.patches.north] })
    const { total, answer } = await listHomes(organisation.manager, north, TODAY)
    const inNorth = every.filter((home) => home.patch?.id === organisation.patches.north)
    expect(answer).toEqual({
      rewireable: inNorth.filter((home) => ['rewireable', 'mixed'].includes(home.boardType)).length,
      unknownBoard: inNorth.filter((home) => home.boardType === 'unknown').length,
    })
    expect(total).toBe(answer?.rewireable)
    expect((await listHomes(organisation.manager, query(), TODAY)).answer).toBeNull()
  })

  it.each(SORTS)('take ten statements at most, by %s', async (sort) => {
    const asked = query({
      sort,
      search: 'row',
      board: ['rewireable-ways', 'unknown'],
      standing: ['lapsed', 'unknown date'],
    })
    const { statements } = await countingStatements(() => listHomes(organisation.manager, asked, TODAY))
    expect(statements.length).toBeGreaterThan(3)
    expect(statements.length).toBeLessThanOrEqual(10)
  })

  it('are empty for a register that is', async () => {
    const { manager } = await (await import('@/tests/builders/an-organisation')).anOrganisation()
    expect(await listHomes(manager, query(), TODAY)).toEqual({
      rows: [],
      next: null,
      total: 0,
      all: 0,
      answer: null,
    })
  })
})
