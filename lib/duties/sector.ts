import { type Tenure } from '@/lib/homes/tenure'

/** The two sectors that the duties of a landlord tell apart. */
export const SECTORS = ['private', 'social'] as const
export type Sector = (typeof SECTORS)[number]

/**
 * The sector that a tenure belongs to. Where the tenure is not known the private sector's rules are taken,
 * since those are enactments in all four nations; leases fall outside either and are read the same way.
 * @example sectorOf('affordable-rent') // 'social'
 */
export function sectorOf(tenure: Tenure): Sector {
  return tenure === 'social-rent' || tenure === 'affordable-rent' ? 'social' : 'private'
}
