/** Somebody who is not signed in, from a network of their own (addresses of RFC 5737, kept for examples). */
import { type Visitor } from '@/lib/use-cases/people/visitor'

let next = 0

/** @example const visitor = aVisitor() */
export const aVisitor = (given: Partial<Visitor> = {}): Visitor => ({
  ip: `192.0.2.${(next += 1) % 256}/${next}`,
  device: null,
  ...given,
})
