import { expect, it } from 'vitest'
import { landingPathOf } from '@/lib/access/landing-path-of'

it.each([
  ['manager', '/today'],
  ['officer', '/today'],
  ['auditor', '/today'],
  ['supervisor', '/visits'],
  ['electrician', '/visits'],
] as const)('a %s begins at %s', (role, path) => expect(landingPathOf({ role })).toBe(path))
