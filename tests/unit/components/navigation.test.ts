import { describe, expect, it } from 'vitest'
import { isAt, navigationFor } from '@/components/shell/navigation'
import { type Actor } from '@/lib/access/actor'
import { type Role } from '@/lib/access/role'

const actor = (role: Role): Actor => ({
  personId: 'p',
  name: 'Ada Holm',
  email: 'ada@marsh-end.example',
  organisationId: 'o',
  organisationName: 'Marsh End Homes',
  role,
  patches: 'all',
})
const labels = (role: Role) => {
  const { places, organisation } = navigationFor(actor(role))
  return [...places, ...organisation].map(({ label }) => label)
}

describe('what the top bar offers', () => {
  it.each<[Role, string[]]>([
    ['manager', ['Today', 'Homes', 'Map', 'Imports', 'People', 'Settings', 'Audit trail']],
    ['auditor', ['Today', 'Homes', 'Map', 'Imports', 'People', 'Settings', 'Audit trail']],
    ['officer', ['Today', 'Homes', 'Map']],
    ['supervisor', ['Visits']],
    ['electrician', ['Visits']],
  ])('a %s', (role, expected) => {
    expect(labels(role)).toEqual(expected)
  })
})

describe('where we are', () => {
  it('is at a place and under it, and not at one that only begins alike', () => {
    expect([isAt('/homes', '/homes'), isAt('/homes/1', '/homes'), isAt('/homestead', '/homes')]).toEqual([
      true,
      true,
      false,
    ])
  })
})
