import { reading } from '@/db/connection'
import * as homeList from '@/db/repositories/home-list'
import * as counts from '@/db/repositories/home-register-counts'
import * as organisations from '@/db/repositories/organisations'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type HomeQuery } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { asksForAll, filterFor, standingOn } from './filter-for'
import { cursorOf, placeOf } from './page-cursor'

export const HOMES_A_PAGE = 50

export type HomeList = {
  readonly rows: readonly HomeRow[]
  /** the cursor of the page after this one; null on the last */
  readonly next: string | null
  /** homes that the query lets through, and homes within the actor's reach */
  readonly total: number
  readonly all: number
  /** where the query asks for homes with rewireable ways: how many have some, and how many may, their board being unknown */
  readonly answer: { readonly rewireable: number; readonly unknownBoard: number } | null
}

/**
 * A page of the homes list: filtered, searched and sorted by the database.
 * A cursor that is none, or belongs to another order, is passed over: the first page is shown.
 */
export async function listHomes(actor: Actor, query: HomeQuery, today: CalendarDay): Promise<HomeList> {
  demand(actor, 'homes.read')
  const scope = reading(actor)
  const reach = reachOf(actor)
  const { noticeDays } = await organisations.get(scope)
  const filter = filterFor(actor, query, today, noticeDays)
  const asksForRewireable = query.board.includes('rewireable-ways')

  const [places, all, counted, answer] = await Promise.all([
    homeList.listPlaces(scope, filter, query, placeOf(query.after, query), HOMES_A_PAGE + 1),
    counts.count(scope, reach),
    asksForAll(query) ? null : homeList.count(scope, filter),
    asksForRewireable ? counts.countRewireable(scope, filter) : null,
  ])
  const page = places.slice(0, HOMES_A_PAGE)
  const last = page.at(-1)
  const homes = await homeList.listByIds(
    scope,
    reach,
    page.map((place) => place.id),
  )
  return {
    rows: homes.map(standingOn(today, noticeDays)),
    next: places.length > HOMES_A_PAGE && last ? cursorOf(query, last) : null,
    total: counted ?? all,
    all,
    answer,
  }
}
