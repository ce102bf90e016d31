/** What a manager chooses for somebody: a role, and patches for an officer. */
import { z } from 'zod'
import { type Scope } from '@/db/connection'
import * as patches from '@/db/repositories/patches'
import { ROLES, type Role } from '@/lib/access/role'
import { Invalid } from '@/lib/errors/expected'
import { listOf } from '@/lib/forms/list-of'
import { reachOfRole } from '@/lib/people/reach-of-role'

export const role = z.enum(ROLES, { error: 'Choose a role.' })
export const patchIds = listOf(z.uuid('Choose among the patches shown.'))

/**
 * How far the chosen role sees.
 * @throws Invalid where a chosen patch is none of this organisation's
 */
export async function chosenReach(
  scope: Scope,
  input: { role: Role; patchIds: readonly string[] },
): Promise<'all' | readonly string[]> {
  const reach = reachOfRole(input.role, input.patchIds)
  if (reach === 'all') return reach
  const known = new Set((await patches.list(scope)).map((patch) => patch.id))
  if (reach.every((id) => known.has(id))) return reach
  throw new Invalid([{ field: 'patchIds', problem: 'Choose among the patches shown.' }])
}
