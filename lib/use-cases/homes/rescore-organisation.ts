import { inTransaction, reading } from '@/db/connection'
import * as homes from '@/db/repositories/homes'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { HOMES_AT_ONCE, refreshHomes } from './refresh-homes'

/**
 * Scores every home of an organisation anew, each chunk in a transaction of its own, so that it can be stopped
 * and run again at any step. Homes are walked by id: one added meanwhile is either walked or fresh already.
 * @param progress told after each chunk how many homes are done, and of how many
 */
export async function rescoreOrganisation(
  owner: { readonly organisationId: string },
  today: CalendarDay,
  progress: (done: number, total: number) => Promise<void> = async () => undefined,
): Promise<void> {
  const total = await homes.count(reading(owner), 'all')
  let done = 0
  let last: string | null = null
  for (;;) {
    const ids: string[] = await homes.listIdsAfter(reading(owner), last, HOMES_AT_ONCE)
    if (ids.length > 0) await inTransaction(owner, (scope) => refreshHomes(scope, ids, today))
    done += ids.length
    await progress(done, Math.max(done, total))
    if (ids.length < HOMES_AT_ONCE) return
    last = ids.at(-1) ?? null
  }
}
