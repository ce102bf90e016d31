import { reading } from '@/db/connection'
import * as homeList from '@/db/repositories/home-list'
import * as counts from '@/db/repositories/home-register-counts'
import * as ranks from '@/db/repositories/home-register-ranks'
import * as organisations from '@/db/repositories/organisations'
import { type Actor } from '@/lib/access/actor'
import { can, demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { mondayOf } from '@/lib/calendar/week-of'
import { type DueWeek, dueWeeks } from '@/lib/duties/due-weeks'
import { type HomeRow } from '@/lib/homes/home-row'
import { standingOn } from '@/lib/use-cases/homes/filter-for'

export type Today = {
  readonly homes: number
  readonly standing: counts.StandingCounts
  /** homes in date or due, of those that the landlord owes [0 to 1]; one never inspected or of unknown date is not in date. Null without homes */
  readonly inDateShare: number | null
  readonly noticeDays: number
  /** the due line: a quarter of a year back, a year on */
  readonly weeks: readonly DueWeek[]
  readonly danger: {
    readonly withC1: number
    readonly withC2: number
    /** homes with an open C1, the highest score first */
    readonly worstC1: readonly HomeRow[]
    /** homes with an open C2, the one found longest ago first; null: nobody knows when */
    readonly oldestC2: readonly { readonly home: HomeRow; readonly raisedOn: CalendarDay | null }[]
  }
  readonly rewireable: {
    readonly patches: readonly counts.PatchCount[]
    readonly withRewireableWays: number
    readonly unknown: number
  }
  /** the highest scores */
  readonly worst: readonly HomeRow[]
  /** what an empty register needs first; null once it has homes */
  readonly firstStep: 'import' | 'ask-a-manager' | 'ask-for-a-patch' | null
}

const WEEKS_BACK = 13
const WEEKS_ON = 53
const MOST_C1 = 10
const MOST_C2 = 5
const MOST_WORST = 8

function firstStepOf(actor: Actor, homes: number): Today['firstStep'] {
  if (homes > 0) return null
  if (actor.patches !== 'all' && actor.patches.length === 0) return 'ask-for-a-patch'
  return can(actor, 'imports.run') ? 'import' : 'ask-a-manager'
}

/** What must be done now: standing, the due line, what is dangerous, and where to look first. Eight statements at most. */
export async function showToday(actor: Actor, today: CalendarDay): Promise<Today> {
  demand(actor, 'homes.read')
  const scope = reading(actor)
  const reach = reachOf(actor)
  const { noticeDays } = await organisations.get(scope)
  const monday = mondayOf(today)
  const [{ standing, danger }, days, patches, worstIds, c1Ids, c2] = await Promise.all([
    counts.countByStanding(scope, reach, today, noticeDays),
    counts.countByDueDay(scope, reach, addDays(monday, -7 * WEEKS_BACK), addDays(monday, 7 * WEEKS_ON - 1)),
    counts.countByPatch(scope, reach),
    ranks.listWorst(scope, reach, MOST_WORST),
    ranks.listWorst(scope, reach, MOST_C1, 'C1'),
    ranks.listOldestOpen(scope, reach, 'C2', MOST_C2),
  ])
  const ids = [...new Set([...worstIds, ...c1Ids, ...c2.map(({ homeId }) => homeId)])]
  const shown = await homeList.listByIds(scope, reach, ids)
  const byId = new Map(shown.map(standingOn(today, noticeDays)).map((home) => [home.id, home]))
  const pick = (some: readonly string[]) => some.flatMap((id) => byId.get(id) ?? [])
  const homes = standing.homes + standing.notOwed
  return {
    homes,
    standing,
    inDateShare: standing.homes === 0 ? null : (standing['in date'] + standing.due) / standing.homes,
    noticeDays,
    weeks: dueWeeks(days, today, { weeksBack: WEEKS_BACK, weeksOn: WEEKS_ON }),
    danger: {
      ...danger,
      worstC1: pick(c1Ids),
      oldestC2: c2.flatMap(({ homeId, raisedOn }) => {
        const home = byId.get(homeId)
        return home ? [{ home, raisedOn }] : []
      }),
    },
    rewireable: {
      patches,
      withRewireableWays: patches.reduce((sum, patch) => sum + patch.withRewireableWays, 0),
      unknown: patches.reduce((sum, patch) => sum + patch.unknown, 0),
    },
    worst: pick(worstIds),
    firstStep: firstStepOf(actor, homes),
  }
}
