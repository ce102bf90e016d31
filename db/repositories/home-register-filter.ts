/** What a homes query asks, as conditions on the register. Lists, counts, maps and exports share it. */
import { type Knex } from 'knex'
import { type Reach } from '@/lib/access/reach'
import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type HomeQuery } from '@/lib/homes/home-query'
import { type Standing } from '@/lib/homes/standing'
import { OUT_OF_SCOPE } from '@/lib/homes/tenure'
import { type Scope } from '@/db/connection'
import { searchPatterns } from './home-register-search'
import { withinReach } from './within-reach'

/** Which homes: those within reach that the query asks for, standing as they do today. */
export type HomeFilter = {
  readonly reach: Reach
  readonly query: Omit<HomeQuery, 'sort' | 'order' | 'columns' | 'after'>
  readonly today: CalendarDay
  /** how long beforehand a home counts as due [days] */
  readonly noticeDays: number
}

type Query = Knex.QueryBuilder

/** The same rule as lib/duties/standing-of, on the columns. */
function whereStanding(either: Query, standing: Standing, { today, noticeDays }: HomeFilter): void {
  const noticeEnds = addDays(today, noticeDays)
  if (standing === 'never inspected') either.orWhere('register.inspection_record', 'never')
  else if (standing === 'unknown date')
    either.orWhere((unknown) =>
      unknown
        .where('register.inspection_record', '<>', 'never')
        .andWhere((row) => row.where('register.inspection_record', 'unknown').orWhereNull('register.due_on')),
    )
  else
    either.orWhere((dated) => {
      dated.where('register.inspection_record', 'dated')
      if (standing === 'lapsed') dated.where('register.due_on', '<', today)
      else if (standing === 'due') dated.whereBetween('register.due_on', [today, noticeEnds])
      else dated.where('register.due_on', '>', noticeEnds)
    })
}

const OPEN_COLUMNS = { C1: 'open_c1', C2: 'open_c2', C3: 'open_c3', FI: 'open_fi' } as const
const ANY_OPEN = Object.values(OPEN_COLUMNS)

function whereSearch(query: Query, search: string): void {
  const patterns = searchPatterns(search)
  if (!patterns) return
  const { all, whole } = patterns
  query.andWhere((either) => {
    either.where((every) => {
      for (const pattern of all) every.where('register.search_text', 'like', pattern)
    })
    if (whole !== null) either.orWhere('register.search_text', 'like', whole)
  })
}

function wherePatch(query: Query, patches: readonly string[]): void {
  const ids = patches.filter((patch) => patch !== 'none')
  if (ids.length === patches.length) query.whereIn('register.patch_id', ids)
  else query.andWhere((either) => either.whereNull('register.patch_id').orWhereIn('register.patch_id', ids))
}

/** A home counts as built between two years where it could have been; one of which nothing is known does not. */
function whereBuilt(query: Query, from: number | undefined, to: number | undefined): void {
  if (from === undefined && to === undefined) return
  query.whereNotNull('register.built_sort')
  if (from !== undefined)
    query.andWhere((row) => row.where('register.built_to', '>=', from).orWhereNull('register.built_to'))
  if (to !== undefined)
    query.andWhere((row) => row.where('register.built_from', '<=', to).orWhereNull('register.built_from'))
}

/** The register's rows that a filter lets through; the board's condition may be left aside, to count beside it. */
export function filtered(scope: Scope, filter: HomeFilter, leave: { board?: boolean } = {}): Query {
  const { query: asked } = filter
  const query: Query = scope
    .db('home_register as register')
    .where('register.organisation_id', scope.organisationId)
  withinReach(query, filter.reach, 'register.patch_id')
  whereSearch(query, asked.search)
  if (asked.patch.length > 0) wherePatch(query, asked.patch)
  if (asked.block.length > 0) query.whereIn('register.block_id', asked.block)
  if (asked.board.length > 0 && !leave.board) {
    const boards = asked.board.flatMap((board) =>
      board === 'rewireable-ways' ? ['rewireable', 'mixed'] : [board],
    )
    query.whereIn('register.board_type', [...new Set(boards)])
  }
  if (asked.cover.length > 0) query.whereIn('register.rcd_cover', asked.cover)
  if (asked.tenure.length > 0) query.whereIn('register.tenure', asked.tenure)
  if (asked.nation.length > 0) query.whereIn('register.nation', asked.nation)
  if (asked.duty.length === 1)
    query.where('register.tenure', asked.duty[0] === 'owed' ? 'not in' : 'in', [...OUT_OF_SCOPE])
  if (asked.standing.length > 0)
    query.andWhere((either) => asked.standing.forEach((standing) => whereStanding(either, standing, filter)))
  if (asked.defects.length > 0)
    query.andWhere((either) => {
      const columns = asked.defects.flatMap((code) => (code === 'any' ? ANY_OPEN : [OPEN_COLUMNS[code]]))
      for (const column of new Set(columns)) either.orWhere(`register.${column}`, '>', 0)
    })
  whereBuilt(query, asked.builtFrom, asked.builtTo)
  if (asked.dueFrom !== undefined) query.where('register.due_on', '>=', asked.dueFrom)
  if (asked.dueTo !== undefined) query.where('register.due_on', '<=', asked.dueTo)
  if (asked.within) {
    const [west, south, east, north] = asked.within
    query.whereBetween('register.longitude', [west, east]).whereBetween('register.latitude', [south, north])
  }
  return query
}
