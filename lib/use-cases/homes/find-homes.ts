import { z } from 'zod'
import { reading } from '@/db/connection'
import * as homeList from '@/db/repositories/home-list'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type BoardType } from '@/lib/homes/board-type'
import { homeQueryOf } from '@/lib/homes/home-query'
import { foldWords } from '@/lib/imports/fold-words'
import { filterFor } from './filter-for'

export const FindHomes = z.object({
  q: z.string().trim().max(120, 'Use 120 characters or fewer.').default(''),
})

export type FoundHome = {
  readonly id: string
  readonly address: string
  readonly town: string | null
  readonly postcode: string | null
  readonly reference: string | null
  readonly uprn: string | null
  readonly boardType: BoardType
  readonly score: number
}

const MOST_FOUND = 8

/** The first few homes that a search box finds by address, postcode, UPRN or reference, exact words first. */
export async function findHomes(
  actor: Actor,
  { q }: z.output<typeof FindHomes>,
  today: CalendarDay,
): Promise<{ homes: readonly FoundHome[] }> {
  demand(actor, 'homes.read')
  const word = foldWords(q)
  if (word === '') return { homes: [] }
  const scope = reading(actor)
  const filter = filterFor(actor, { ...homeQueryOf({}), search: q }, today, 0)
  const ids = await homeList.listFound(scope, filter, word, MOST_FOUND)
  const homes = await homeList.listByIds(scope, reachOf(actor), ids)
  return {
    homes: homes.map(({ id, address, town, postcode, reference, uprn, boardType, score }) => ({
      id,
      address,
      town,
      postcode,
      reference,
      uprn,
      boardType,
      score,
    })),
  }
}
