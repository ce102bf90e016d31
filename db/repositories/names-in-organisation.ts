/** What patches and blocks have alike: a name that is used once in an organisation. See also named-places.ts. */
import { NotFound } from '@/lib/errors/expected'
import { type Scope } from '@/db/connection'

export type Named = { readonly id: string; readonly name: string }
type Table = 'patches' | 'blocks'

const within = (scope: Scope, table: Table) => scope.db(table).where('organisation_id', scope.organisationId)

export const listNames = async (scope: Scope, table: Table): Promise<Named[]> =>
  (await within(scope, table).orderBy('name').select('id', 'name')) as Named[]

export async function getName(scope: Scope, table: Table, id: string): Promise<Named> {
  const row = (await within(scope, table).where({ id }).first('id', 'name')) as Named | undefined
  if (!row) throw new NotFound(table === 'patches' ? 'That patch' : 'That block')
  return row
}

export const findName = async (scope: Scope, table: Table, name: string): Promise<Named | null> =>
  ((await within(scope, table).where({ name: name.trim() }).first('id', 'name')) as Named | undefined) ?? null
