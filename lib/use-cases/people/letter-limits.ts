/** How many letters may be asked for. Judgement: nobody rightful comes near, and nobody's inbox is flooded. */
import { deployment } from '@/db/connection'
import * as rateLimits from '@/db/repositories/rate-limits'
import { Conflict } from '@/lib/errors/expected'
import { type Visitor } from './visitor'

const HOUR = 60 * 60

export const LETTERS_BY_NETWORK: rateLimits.Limit = { name: 'letter-network', times: 60, seconds: HOUR }
export const LETTERS_TO_ADDRESS: rateLimits.Limit = { name: 'letter-address', times: 5, seconds: HOUR }

/**
 * Counts one letter that a visitor asks for. Whether the address has had its share is not for the visitor to know, so
 * it is an answer and no refusal; whoever owns the address has the letters that were sent.
 * @returns whether a letter may go to the address
 * @throws Conflict where the visitor's network asked for too many
 */
export async function mayWriteTo(visitor: Visitor, email: string): Promise<boolean> {
  const network = await rateLimits.take(deployment(), LETTERS_BY_NETWORK, visitor.ip)
  if (!network.allowed) throw new Conflict('There were too many requests from here. Try again in an hour.')
  return (await rateLimits.take(deployment(), LETTERS_TO_ADDRESS, email)).allowed
}
