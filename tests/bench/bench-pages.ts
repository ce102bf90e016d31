import { pool } from '@/db/knex'
import { type Actor } from '@/lib/access/actor'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { homeQueryOf } from '@/lib/homes/home-query'
import { listHomes } from '@/lib/use-cases/homes/list-homes'
import { showToday } from '@/lib/use-cases/today/show-today'
import { filterChoices } from '@/lib/use-cases/homes/filter-choices'
import { type Figure } from './figures'
import { timing } from './measure'
import { signInCookie } from './sign-in-cookie'
import { type Statement, statementsOf } from './statements'

const today = calendarDay('2026-12-01')
const TIMES = 40

const QUERIES: readonly (readonly [string, Record<string, string>])[] = [
  ['list, highest score', {}],
  ['list, by address', { sort: 'address', order: 'asc' }],
  ['list, report ending first', { sort: 'due', order: 'asc' }],
  ['list, oldest built', { sort: 'built', order: 'asc' }],
  ['filter: rewireable fuses', { board: 'rewireable-ways' }],
  ['filter: lapsed', { standing: 'lapsed' }],
  ['filter: open C1 or C2', { defects: 'C1,C2' }],
  ['filter: no RCD, before 1960', { cover: 'none', builtTo: '1960' }],
  ['search: two words', { search: 'copper 12' }],
]

/** The same statements, bare: straight through the driver, one after another. */
async function bare(statements: readonly Statement[]): Promise<void> {
  for (const { sql, bindings } of statements) await pool().raw(sql, bindings as readonly string[])
}

async function firstByte(url: string, cookie: string): Promise<void> {
  const answer = await fetch(url, { headers: { cookie }, redirect: 'manual' })
  if (answer.status !== 200) throw new Error(`${url} answered ${answer.status}`)
  const reader = answer.body?.getReader()
  await reader?.read()
  await reader?.cancel()
}

/** How many statements a page sends, counted by the server itself: the fewest of several, since the worker asks too. */
async function statementsOfPage(url: string, cookie: string): Promise<number> {
  const counts: number[] = []
  for (let run = 0; run < 8; run += 1) counts.push(await countStatements(url, cookie))
  return Math.min(...counts)
}

async function countStatements(url: string, cookie: string): Promise<number> {
  const questions = async () => {
    const [rows] = (await pool().raw("show global status like 'Questions'")) as [{ Value: string }[], unknown]
    return Number(rows[0]?.Value)
  }
  const own = -(await questions()) + (await questions())
  const before = await questions()
  await (await fetch(url, { headers: { cookie } })).text()
  return (await questions()) - before - own
}

/** The list, its filters and sorts, Today, and the pages that show them, each beside its own statements run bare. */
export async function benchPages(actor: Actor, site: string): Promise<Figure[]> {
  const figures: Figure[] = []
  for (const [what, params] of QUERIES) {
    const query = homeQueryOf(params)
    const work = () => listHomes(actor, query, today)
    const statements = await statementsOf(work)
    const own = await timing(TIMES, work)
    const alone = await timing(TIMES, () => bare(statements))
    figures.push({ what: `${what}, p95`, value: own.p95, unit: 'ms', bare: alone.p95, most: 3 })
  }
  const cookie = await signInCookie(actor)
  const pages: readonly (readonly [string, string, () => Promise<unknown>])[] = [
    [
      'Homes',
      '/homes',
      () => Promise.all([listHomes(actor, homeQueryOf({}), today), filterChoices(actor, today)]),
    ],
    [
      'Homes with rewireable fuses',
      '/homes?board=rewireable-ways',
      () =>
        Promise.all([
          listHomes(actor, homeQueryOf({ board: 'rewireable-ways' }), today),
          filterChoices(actor, today),
        ]),
    ],
    ['Today', '/today', () => showToday(actor, today)],
  ]
  for (const [name, path, work] of pages) {
    const statements = await statementsOf(work)
    const own = await timing(TIMES, () => firstByte(`${site}${path}`, cookie))
    const alone = await timing(TIMES, () => bare(statements))
    figures.push({
      what: `${name}, first byte, median`,
      value: own.median,
      unit: 'ms',
      bare: alone.median,
      most: 3,
    })
    figures.push({ what: `${name}, first byte, p95`, value: own.p95, unit: 'ms', bare: alone.p95 })
    figures.push({
      what: `${name}, statements`,
      value: await statementsOfPage(`${site}${path}`, cookie),
      unit: '',
      most: 10,
      mostIs: 'value',
    })
  }
  return figures
}
