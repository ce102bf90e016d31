import { type Actor } from './actor'

/** Which homes a list, count, map, export or search may hold: all of the organisation's, or those of some patches. */
export type Reach = 'all' | readonly string[]

/**
 * How far an actor sees. A person who answers for no patch yet sees no home.
 * @example reachOf({ ...officer, patches: ['p1', 'p2'] }) // ['p1', 'p2']
 */
export function reachOf(actor: Actor): Reach {
  return actor.patches
}
