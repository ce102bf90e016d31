import { type Role } from '@/lib/access/role'

/**
 * How far a role sees, given the patches that were chosen for it. Only an officer is bound to patches, and to none in
 * particular where none is chosen; a contractor's people see no homes by patch at all, only their own work.
 * @example reachOfRole('officer', ['north']) // ['north']
 * @example reachOfRole('officer', []) // 'all'
 * @example reachOfRole('electrician', ['north']) // []
 */
export function reachOfRole(role: Role, patchIds: readonly string[]): 'all' | readonly string[] {
  if (role === 'supervisor' || role === 'electrician') return []
  if (role === 'officer' && patchIds.length > 0) return [...new Set(patchIds)]
  return 'all'
}
