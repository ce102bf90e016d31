import { expect, it } from 'vitest'
import { pauseAfter } from '@/lib/use-cases/people/sign-in-limits'

it('holds nobody back for the first twenty tries, then longer and longer, four seconds at most', () =>
  expect([1, 20, 21, 25, 40, 1_000_000].map(pauseAfter)).toEqual([0, 0, 0.2, 1, 4, 4]))
