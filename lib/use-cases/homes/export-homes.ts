import { inTransaction, reading, type Scope } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as homeList from '@/db/repositories/home-list'
import { type HomeFilter } from '@/db/repositories/home-register-filter'
import * as organisations from '@/db/repositories/organisations'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type HomeQuery, homeQueryText } from '@/lib/homes/home-query'
import { exportCells, exportHeadings } from './export-columns'
import { filterFor, standingOn } from './filter-for'

export type ExportCell = string | number | null

export type HomesExport = {
  readonly headings: readonly string[]
  /** how many rows there were when it began */
  readonly count: number
  readonly rows: AsyncIterable<readonly ExportCell[]>
}

/** How many homes are read at once: enough to be quick, few enough to be no burden. */
const HOMES_A_READ = 1_000

async function* rowsOf(
  scope: Scope,
  filter: HomeFilter,
  query: HomeQuery,
): AsyncIterable<readonly ExportCell[]> {
  const standing = standingOn(filter.today, filter.noticeDays)
  let after: homeList.Place | null = null
  for (;;) {
    const places: homeList.Place[] = await homeList.listPlaces(scope, filter, query, after, HOMES_A_READ)
    const homes = await homeList.listByIds(
      scope,
      filter.reach,
      places.map((place) => place.id),
    )
    for (const home of homes) yield exportCells(standing(home), query.columns)
    after = places.at(-1) ?? null
    if (places.length < HOMES_A_READ) return
  }
}

/**
 * Every home that a query lets through, in its order, with the columns on screen; address, postcode, UPRN and
 * reference always. The rows are read as they are taken, never all at once. That it was taken is on the audit
 * trail before the first row is.
 */
export async function exportHomes(actor: Actor, query: HomeQuery, today: CalendarDay): Promise<HomesExport> {
  demand(actor, 'homes.export')
  const scope = reading(actor)
  const { noticeDays } = await organisations.get(scope)
  const filter = filterFor(actor, query, today, noticeDays)
  const count = await homeList.count(scope, filter)
  await inTransaction(actor, (writing) =>
    audit.record(writing, {
      actorId: actor.personId,
      did: 'homes.exported',
      subjectKind: 'organisation',
      subjectId: actor.organisationId,
      detail: {
        count,
        query: homeQueryText({ ...query, after: undefined, search: '' }),
        searched: query.search !== '',
      },
    }),
  )
  return { headings: exportHeadings(query.columns), count, rows: rowsOf(scope, filter, query) }
}
