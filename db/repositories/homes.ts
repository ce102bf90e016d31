/** Homes: who and where. What is known of their wiring is in home-facts.ts, the derived row in home-register.ts. */
import { type Reach } from '@/lib/access/reach'
import { NotFound } from '@/lib/errors/expected'
import { type Nation } from '@/lib/homes/nation'
import { type Tenure } from '@/lib/homes/tenure'
import { type Scope, type WritingScope } from '@/db/connection'
import { insertRows, type Value } from './insert-rows'
import { withinReach } from './within-reach'

export type Home = {
  readonly id: string
  readonly kind: 'dwelling' | 'communal'
  readonly reference: string | null
  readonly uprn: string | null
  readonly address: string
  readonly town: string | null
  readonly postcode: string | null
  /** folded address and postcode: the same for the same home however it is typed */
  readonly addressKey: string
  readonly nation: Nation
  readonly tenure: Tenure
  readonly patchId: string | null
  readonly blockId: string | null
  readonly latitude: number | null
  readonly longitude: number | null
  readonly note: string | null
}

const COLUMN_OF = {
  id: 'id',
  kind: 'kind',
  reference: 'reference',
  uprn: 'uprn',
  address: 'address',
  town: 'town',
  postcode: 'postcode',
  addressKey: 'address_key',
  nation: 'nation',
  tenure: 'tenure',
  patchId: 'patch_id',
  blockId: 'block_id',
  latitude: 'latitude',
  longitude: 'longitude',
  note: 'note',
} as const satisfies Record<keyof Home, string>
const FIELDS = Object.keys(COLUMN_OF) as (keyof Home)[]
const COLUMNS = FIELDS.map((field) => COLUMN_OF[field])

type Row = Omit<Home, 'uprn' | 'addressKey' | 'patchId' | 'blockId'> & {
  readonly uprn: number | null
  readonly address_key: string
  readonly patch_id: string | null
  readonly block_id: string | null
}

const toHome = ({ address_key, patch_id, block_id, uprn, ...row }: Row): Home => ({
  ...row,
  uprn: uprn === null ? null : String(uprn),
  addressKey: address_key,
  patchId: patch_id,
  blockId: block_id,
})

const within = (scope: Scope) => scope.db('homes').where('organisation_id', scope.organisationId)

/** A home by its id, or null where there is none within reach. */
export async function findById(scope: Scope, reach: Reach, id: string): Promise<Home | null> {
  const row = (await withinReach(within(scope), reach).where({ id }).first(COLUMNS)) as Row | undefined
  return row ? toHome(row) : null
}

/** A home by its id. @throws NotFound where there is none within reach */
export async function getById(scope: Scope, reach: Reach, id: string): Promise<Home> {
  const home = await findById(scope, reach, id)
  if (!home) throw new NotFound('That home')
  return home
}

/** A home by its id, held against other writers until the transaction ends. @throws NotFound as getById */
export async function getForChange(scope: WritingScope, reach: Reach, id: string): Promise<Home> {
  const row = (await withinReach(within(scope), reach).where({ id }).forUpdate().first(COLUMNS)) as
    Row | undefined
  if (!row) throw new NotFound('That home')
  return toHome(row)
}

/** Homes by their ids, in no order; ids of other organisations are passed over. */
export async function listByIds(scope: Scope, ids: readonly string[]): Promise<Home[]> {
  if (ids.length === 0) return []
  return (
    (await within(scope)
      .whereIn('id', [...ids])
      .select(COLUMNS)) as Row[]
  ).map(toHome)
}

/** Homes that share a UPRN, a reference or a folded address with one; held, so that two alike are not added at once. */
export async function listAlike(
  scope: WritingScope,
  { uprn, reference, addressKey }: Pick<Home, 'uprn' | 'reference' | 'addressKey'>,
): Promise<Home[]> {
  const rows = (await within(scope)
    .andWhere((either) => {
      either.where('address_key', addressKey)
      if (uprn !== null) either.orWhere('uprn', uprn)
      if (reference !== null) either.orWhere('reference', reference)
    })
    .forUpdate()
    .select(COLUMNS)) as Row[]
  return rows.map(toHome)
}

/** Ids in their own order, from after one of them: how a job walks every home. */
export async function listIdsAfter(scope: Scope, after: string | null, limit: number): Promise<string[]> {
  const query = within(scope).orderBy('id').limit(limit).select('id')
  if (after !== null) query.andWhere('id', '>', after)
  return ((await query) as { id: string }[]).map((row) => row.id)
}

/** How many homes there are within reach. */
export async function count(scope: Scope, reach: Reach): Promise<number> {
  const row = (await withinReach(within(scope), reach).count({ homes: '*' }).first()) as { homes: number }
  return Number(row.homes)
}

/** Adds homes, many to a statement. */
export async function insertMany(scope: WritingScope, homes: readonly Home[]): Promise<void> {
  const rows = homes.map((home): Value[] => [scope.organisationId, ...FIELDS.map((field) => home[field])])
  await insertRows(scope.db, 'homes', ['organisation_id', ...COLUMNS], rows)
}

/** Changes some fields of one home. */
export async function update(
  scope: WritingScope,
  id: string,
  changes: Partial<Omit<Home, 'id'>>,
): Promise<void> {
  const columns = Object.fromEntries(
    Object.entries(changes).map(([field, value]) => [COLUMN_OF[field as keyof Home], value]),
  )
  if (Object.keys(columns).length > 0) await within(scope).where({ id }).update(columns)
}
