import { beforeAll, describe, expect, it } from 'vitest'
import { ACTION_CALLS, TODAY } from '@/tests/access/action-calls'
import { aWorld, type World } from '@/tests/access/a-world'
import { SIGNED_IN } from '@/tests/access/everybody'
import { ACTIONS } from '@/tests/access/matrix'
import { type Outcome, outcomeOf } from '@/tests/access/outcome-of'
import { isRefusal, NotAllowed, NotFound } from '@/lib/errors/expected'

const guarded = Object.entries(ACTIONS).filter(([, row]) => row.needs)

/** Nothing listens where these tests send files and letters (own-database.ts): who gets as far has been let in. */
const isOutsideService = (thrown: unknown) => (thrown as { code?: unknown }).code === 'ECONNREFUSED'

/** A use-case that finds the input wrong, or itself too late, has let its actor in. */
async function outcome(call: () => Promise<unknown>): Promise<Outcome> {
  try {
    await call()
    return 'let in'
  } catch (thrown) {
    if (thrown instanceof NotAllowed) return 'refused'
    if (thrown instanceof NotFound) return 'hidden'
    if (isRefusal(thrown) || isOutsideService(thrown)) return 'let in'
    throw thrown
  }
}

it('every guarded action of the matrix can be called', () =>
  expect(Object.keys(ACTION_CALLS).sort()).toEqual(guarded.map(([entry]) => entry).sort()))

describe.each(guarded)('%s', (entry, row) => {
  let world: World
  beforeAll(async () => void (world = await aWorld()))

  // those who must not get in try first, so that they cannot fail merely because the thing is gone
  const inOrder = [...SIGNED_IN].sort(
    (one, other) => Number(row.lets.includes(one)) - Number(row.lets.includes(other)),
  )

  it.each(inOrder.map((somebody) => [somebody, outcomeOf(row, somebody)] as const))(
    '%s: %s',
    async (somebody, expected) => {
      const actor = world.actors[somebody as keyof World['actors']]
      expect(await outcome(() => ACTION_CALLS[entry]!(actor, world, TODAY))).toBe(expected)
    },
  )
})
