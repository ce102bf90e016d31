import 'server-only'
import { notFound } from 'next/navigation'
import { NotAllowed, NotFound } from '@/lib/errors/expected'

/**
 * What a page reads. What is not there, and what is not this person's to see, are one and the same page: not found.
 * @example const home = await show(showHome(actor, { homeId }, today()))
 */
export async function show<Result>(reading: Promise<Result>): Promise<Result> {
  try {
    return await reading
  } catch (thrown) {
    if (thrown instanceof NotFound || thrown instanceof NotAllowed) notFound()
    throw thrown
  }
}
