/** Patches: the parts of a portfolio that officers answer for. */
import { newId } from '@/lib/platform/new-id'
import { type Scope, type WritingScope } from '@/db/connection'
import { findName, getName, listNames, type Named } from './names-in-organisation'

export type Patch = Named

/** Every patch of the organisation by name. */
export const list = (scope: Scope): Promise<Patch[]> => listNames(scope, 'patches')

/** A patch by its id. @throws NotFound where there is none */
export const getById = (scope: Scope, id: string): Promise<Patch> => getName(scope, 'patches', id)

/** A patch by its name, in any case, or null. */
export const findByName = (scope: Scope, name: string): Promise<Patch | null> =>
  findName(scope, 'patches', name)

/** Adds a patch; the name must be free. */
export async function insert(scope: WritingScope, name: string): Promise<Patch> {
  const patch = { id: newId(), name: name.trim() }
  await scope.db('patches').insert({ organisation_id: scope.organisationId, ...patch })
  return patch
}

/** Renames a patch; the name must be free. */
export async function rename(scope: WritingScope, id: string, name: string): Promise<void> {
  await scope.db('patches').where({ organisation_id: scope.organisationId, id }).update({ name: name.trim() })
}
