import { type Knex } from 'knex'

/** The patches of the `membership` row of a query, as one column of ids with commas between; null where there are none. */
export const patchIdsOf = (db: Knex): Knex.QueryBuilder =>
  db('membership_patches as patch')
    .where('patch.organisation_id', db.ref('membership.organisation_id'))
    .where('patch.person_id', db.ref('membership.person_id'))
    .select(db.raw('group_concat(patch.patch_id)'))
