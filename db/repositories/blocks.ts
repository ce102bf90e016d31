/** Blocks: buildings whose homes share an address and a landlord's supply. */
import { newId } from '@/lib/platform/new-id'
import { type Scope, type WritingScope } from '@/db/connection'
import { findName, getName, listNames, type Named } from './names-in-organisation'

export type Block = Named

/** Every block of the organisation by name. */
export const list = (scope: Scope): Promise<Block[]> => listNames(scope, 'blocks')

/** A block by its id. @throws NotFound where there is none */
export const getById = (scope: Scope, id: string): Promise<Block> => getName(scope, 'blocks', id)

/** A block by its name, in any case, or null. */
export const findByName = (scope: Scope, name: string): Promise<Block | null> =>
  findName(scope, 'blocks', name)

/** Adds a block; the name must be free. */
export async function insert(scope: WritingScope, name: string): Promise<Block> {
  const block = { id: newId(), name: name.trim() }
  await scope.db('blocks').insert({ organisation_id: scope.organisationId, ...block })
  return block
}
