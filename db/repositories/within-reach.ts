import { type Knex } from 'knex'
import { type Reach } from '@/lib/access/reach'

/** Narrows a query to the homes that a person may see. A home in no patch is seen only by those who see all. */
export function withinReach<Q extends Knex.QueryBuilder>(query: Q, reach: Reach, column = 'patch_id'): Q {
  if (reach === 'all') return query
  return (reach.length === 0 ? query.whereRaw('1 = 0') : query.whereIn(column, [...reach])) as Q
}
