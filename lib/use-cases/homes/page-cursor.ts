/** Where a page of the homes list ended, as an opaque text in the URL. */
import { z } from 'zod'
import { fits, type Ordering, type Place } from '@/db/repositories/home-list'
import { SORTS } from '@/lib/homes/home-query'

const Cursor = z.tuple([
  z.enum(SORTS),
  z.enum(['asc', 'desc']),
  z.union([z.string(), z.number(), z.null()]),
  z.uuid(),
])

/** The cursor of the page that follows a place. */
export const cursorOf = ({ sort, order }: Ordering, place: Place): string =>
  Buffer.from(JSON.stringify([sort, order, place.value, place.id])).toString('base64url')

/** The place that a cursor holds; null, so the first page, where it is none or belongs to another order. */
export function placeOf(cursor: string | undefined, ordering: Ordering): Place | null {
  if (cursor === undefined) return null
  try {
    const parsed = Cursor.safeParse(JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8')))
    if (!parsed.success) return null
    const [sort, order, value, id] = parsed.data
    const place = { value, id }
    return sort === ordering.sort && order === ordering.order && fits(place, ordering) ? place : null
  } catch {
    return null
  }
}
