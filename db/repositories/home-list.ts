/** Pages of the homes list, by keyset: a page begins where the one before ended, however far down that is. */
import { type Knex } from 'knex'
import { type Reach } from '@/lib/access/reach'
import { type Sort } from '@/lib/homes/home-query'
import { type Scope } from '@/db/connection'
import { filtered, type HomeFilter } from './home-register-filter'
import { type RegisteredHome, type RegisterRow, toRegisteredHome } from './home-register'
import { withinReach } from './within-reach'

/** Where a page ended: the value that it is sorted by, null where that is not known, and the home. */
export type Place = { readonly value: string | number | null; readonly id: string }

export type Ordering = { readonly sort: Sort; readonly order: 'asc' | 'desc' }

const SORTED_BY: Record<Sort, { column: string; mayLack: boolean }> = {
  score: { column: 'register.score', mayLack: false },
  address: { column: 'register.address_sort', mayLack: false },
  due: { column: 'register.due_on', mayLack: true },
  built: { column: 'register.built_sort', mayLack: true },
  inspected: { column: 'register.inspected_on', mayLack: true },
}

/** Whether a place can have come from a list in this order. */
export const fits = (place: Place, { sort }: Ordering): boolean =>
  place.value === null
    ? SORTED_BY[sort].mayLack
    : typeof place.value === (sort === 'score' || sort === 'built' ? 'number' : 'string')

/** Homes with the same value follow one another as the index has them, so that it serves both directions. */
const tieOrder = ({ sort, order }: Ordering) =>
  sort === 'score' ? (order === 'desc' ? 'asc' : 'desc') : order

type Key = { id: string; value: string | number | null }

/**
 * The first homes of a query in an order, from after a place. What a search looks in is in no index: walking one
 * in order would fetch every home apart until enough are found, so `scan` reads them as they lie and sorts the found.
 */
function keysAfter(
  query: Knex.QueryBuilder,
  ordering: Ordering,
  after: Place | null,
  limit: number,
  scan: boolean,
): Promise<Key[]> {
  const { column } = SORTED_BY[ordering.sort]
  const tie = tieOrder(ordering)
  const beyond = { asc: '>', desc: '<' } as const
  if (after)
    query
      .where(column, `${beyond[ordering.order]}=`, after.value)
      .andWhere((further) =>
        further
          .where(column, beyond[ordering.order], after.value)
          .orWhere('register.home_id', beyond[tie], after.id),
      )
  // an expression keeps the planner from walking the index of the column itself
  if (scan) query.orderByRaw(`if(true, ${column}, null) ${ordering.order}`)
  else query.orderBy(column, ordering.order)
  return query
    .orderBy('register.home_id', tie)
    .limit(limit)
    .select({ id: 'register.home_id', value: column }) as unknown as Promise<Key[]>
}

/** Homes that lack the value come last, in the order of their ids. */
function keysWithout(
  query: Knex.QueryBuilder,
  ordering: Ordering,
  afterId: string | null,
  limit: number,
): Promise<Key[]> {
  const { column } = SORTED_BY[ordering.sort]
  const tie = tieOrder(ordering)
  query.whereNull(column)
  if (afterId !== null) query.where('register.home_id', tie === 'asc' ? '>' : '<', afterId)
  return query
    .orderBy('register.home_id', tie)
    .limit(limit)
    .select({ id: 'register.home_id', value: column }) as unknown as Promise<Key[]>
}

/** The homes that follow a place, in order: two statements at most, the second only past the last known value. */
export async function listPlaces(
  scope: Scope,
  filter: HomeFilter,
  ordering: Ordering,
  after: Place | null,
  limit: number,
): Promise<Place[]> {
  const { column, mayLack } = SORTED_BY[ordering.sort]
  const known: Key[] = []
  if (after === null || after.value !== null) {
    const query = filtered(scope, filter)
    if (mayLack) query.whereNotNull(column)
    known.push(...(await keysAfter(query, ordering, after, limit, filter.query.search.trim() !== '')))
  }
  if (!mayLack || known.length === limit) return known
  const afterId = after?.value === null ? after.id : null
  return [...known, ...(await keysWithout(filtered(scope, filter), ordering, afterId, limit - known.length))]
}

/** Homes by their ids and in their order, with the names of their patches and blocks: one statement. */
export async function listByIds(
  scope: Scope,
  reach: Reach,
  ids: readonly string[],
): Promise<RegisteredHome[]> {
  if (ids.length === 0) return []
  const query = scope
    .db('home_register as register')
    .join('homes as home', (on) =>
      on.on('home.organisation_id', 'register.organisation_id').andOn('home.id', 'register.home_id'),
    )
    .leftJoin('patches as patch', (on) =>
      on.on('patch.organisation_id', 'register.organisation_id').andOn('patch.id', 'register.patch_id'),
    )
    .leftJoin('blocks as block', (on) =>
      on.on('block.organisation_id', 'register.organisation_id').andOn('block.id', 'register.block_id'),
    )
    .where('register.organisation_id', scope.organisationId)
    .whereIn('register.home_id', [...ids])
    .select('register.*', 'home.reference', 'home.uprn', 'home.address', 'home.town', 'home.postcode')
    .select('patch.name as patch_name', 'block.name as block_name')
  const rows = (await withinReach(query, reach, 'register.patch_id')) as RegisterRow[]
  const byId = new Map(rows.map((row) => [row.home_id, row]))
  return ids.flatMap((id) => {
    const row = byId.get(id)
    return row ? [toRegisteredHome(row)] : []
  })
}

/** How many homes a filter lets through. */
export async function count(scope: Scope, filter: HomeFilter): Promise<number> {
  const row = (await filtered(scope, filter).count({ homes: '*' }).first()) as { homes: number }
  return Number(row.homes)
}

/** The homes that a search finds: whole words and whole numbers first, then by address. */
export async function listFound(
  scope: Scope,
  filter: HomeFilter,
  word: string,
  limit: number,
): Promise<string[]> {
  const rows = (await filtered(scope, filter)
    .orderByRaw('register.search_text like ? desc', [`% ${word} %`])
    .orderBy([{ column: 'register.address_sort' }, { column: 'register.home_id' }])
    .limit(limit)
    .select({ id: 'register.home_id' })) as { id: string }[]
  return rows.map((row) => row.id)
}
