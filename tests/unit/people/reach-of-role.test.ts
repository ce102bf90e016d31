import { expect, it } from 'vitest'
import { reachOfRole } from '@/lib/people/reach-of-role'

it.each([
  ['manager', ['p'], 'all'],
  ['auditor', ['p'], 'all'],
  ['officer', [], 'all'],
  ['officer', ['p', 'q', 'p'], ['p', 'q']],
  ['supervisor', [], []],
  ['electrician', ['p'], []],
] as const)('a %s given %j sees %j', (role, chosen, reach) =>
  expect(reachOfRole(role, chosen)).toEqual(reach),
)
