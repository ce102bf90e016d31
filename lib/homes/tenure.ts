/** How a home is held. Homes on a long lease are kept in the register but owe no inspection by the landlord. */
export const TENURES = [
  'social-rent',
  'affordable-rent',
  'private-rent',
  'market-rent',
  'shared-ownership',
  'leasehold',
  'unknown',
] as const
export type Tenure = (typeof TENURES)[number]

export const TENURE_NAMES: Record<Tenure, string> = {
  'social-rent': 'Social rent',
  'affordable-rent': 'Affordable rent',
  'private-rent': 'Private rent',
  'market-rent': 'Market rent',
  'shared-ownership': 'Shared ownership',
  leasehold: 'Leasehold',
  unknown: 'Not known',
}

/** Long leases, where the leaseholder answers for the wiring. */
export const OUT_OF_SCOPE: readonly Tenure[] = ['shared-ownership', 'leasehold']

/**
 * Whether the landlord's duty to inspect covers this tenure; unknown counts as covered.
 * @source SI 2020/312 Schedule 1: long leases, and rights of occupation of seven years or more, are excluded
 */
export const isInScope = (tenure: Tenure): boolean => !OUT_OF_SCOPE.includes(tenure)
