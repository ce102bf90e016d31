import { z } from 'zod'

/**
 * A field that may come never, once or many times (tick boxes, repeated query parameters), as a list.
 * @example listOf(z.string()).parse('a') // ['a']
 */
export const listOf = <Item extends z.ZodType>(item: Item) =>
  z.preprocess((given) => (given === undefined ? [] : Array.isArray(given) ? given : [given]), z.array(item))
