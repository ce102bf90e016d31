import { type HomeFilter } from '@/db/repositories/home-register-filter'
import { type RegisteredHome } from '@/db/repositories/home-register'
import { type Actor } from '@/lib/access/actor'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { standingOf } from '@/lib/duties/standing-of'
import { type HomeQuery } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'

/** What an actor asks of the register, narrowed to what they may see. */
export const filterFor = (
  actor: Actor,
  query: HomeQuery,
  today: CalendarDay,
  noticeDays: number,
): HomeFilter => ({
  reach: reachOf(actor),
  query,
  today,
  noticeDays,
})

/** A registered home with where it stands on a day. */
export const standingOn =
  (today: CalendarDay, noticeDays: number) =>
  (home: RegisteredHome): HomeRow => ({
    ...home,
    standing: standingOf({ record: home.inspectionRecord, dueOn: home.dueOn, today, noticeDays }),
  })

/** Whether a query lets every home through. */
export const asksForAll = (query: HomeQuery): boolean =>
  query.search.trim() === '' &&
  [
    query.patch,
    query.block,
    query.board,
    query.cover,
    query.standing,
    query.tenure,
    query.nation,
    query.duty,
    query.defects,
  ].every((chosen) => chosen.length === 0) &&
  [query.builtFrom, query.builtTo, query.dueFrom, query.dueTo, query.within].every(
    (bound) => bound === undefined,
  )
