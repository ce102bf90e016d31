import { type Role } from '@/lib/access/role'

/**
 * Which homes somebody sees, in words.
 * @example patchesInWords('officer', ['North', 'South']) // 'North, South'
 */
export function patchesInWords(role: Role, patchNames: 'all' | readonly string[]): string {
  if (role === 'supervisor' || role === 'electrician') return 'Only work issued to them'
  return patchNames === 'all' ? 'Every home' : patchNames.join(', ') || 'No home'
}
