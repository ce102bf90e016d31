/** Patches and blocks by their name, made where they are missing. */
import { foldName } from '@/lib/homes/fold-name'
import { newId } from '@/lib/platform/new-id'
import { type Scope, type WritingScope } from '@/db/connection'

type Table = 'patches' | 'blocks'
type Row = { id: string; name: string }

/** Every patch or block of the organisation, by its folded name. */
export async function listByName(scope: Scope, table: Table): Promise<Map<string, string>> {
  const rows = (await scope
    .db(table)
    .where('organisation_id', scope.organisationId)
    .select('id', 'name')) as Row[]
  return new Map(rows.map((row) => [foldName(row.name), row.id]))
}

/** Makes those that are missing; `known` learns them. */
export async function addMissing(
  scope: WritingScope,
  table: Table,
  names: readonly string[],
  known: Map<string, string>,
): Promise<void> {
  for (const name of names) {
    if (known.has(foldName(name))) continue
    const id = newId()
    await scope
      .db(table)
      .insert({ organisation_id: scope.organisationId, id, name: name.trim().replace(/\s+/g, ' ') })
    known.set(foldName(name), id)
  }
}
