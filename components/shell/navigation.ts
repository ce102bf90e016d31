import { type Actor } from '@/lib/access/actor'
import { can } from '@/lib/access/can'
import { type Permission } from '@/lib/access/permission'

export type Place = { readonly href: string; readonly label: string }
export type Navigation = { readonly places: readonly Place[]; readonly organisation: readonly Place[] }

type Guarded = Place & { readonly needs: Permission }

const PLACES: readonly Guarded[] = [
  { href: '/today', label: 'Today', needs: 'homes.read' },
  { href: '/homes', label: 'Homes', needs: 'homes.read' },
  { href: '/map', label: 'Map', needs: 'homes.read' },
  { href: '/visits', label: 'Visits', needs: 'visits.read' },
]
const ORGANISATION: readonly Guarded[] = [
  { href: '/imports', label: 'Imports', needs: 'imports.read' },
  { href: '/people', label: 'People', needs: 'people.read' },
  { href: '/settings', label: 'Settings', needs: 'organisation.read' },
  { href: '/audit', label: 'Audit trail', needs: 'audit.read' },
]

/**
 * What the top bar offers an actor: what their role may open. The pages guard themselves.
 * @example navigationFor(officer).organisation // []
 */
export function navigationFor(actor: Actor): Navigation {
  const allowed = (places: readonly Guarded[]) =>
    places.filter(({ needs }) => can(actor, needs)).map(({ href, label }) => ({ href, label }))
  return { places: allowed(PLACES), organisation: allowed(ORGANISATION) }
}

/**
 * Whether a path lies at or under a place.
 * @example isAt('/homes/1', '/homes') // true
 */
export const isAt = (path: string, href: string): boolean => path === href || path.startsWith(`${href}/`)
