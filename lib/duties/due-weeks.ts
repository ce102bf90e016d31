import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { mondayOf } from '@/lib/calendar/week-of'

/** One week of the due line. */
export type DueWeek = {
  readonly monday: CalendarDay
  /** homes whose report ends in this week */
  readonly homes: number
  /** whether the whole week lies before today; the current week never does */
  readonly past: boolean
}

/**
 * How many homes fall due in each week around today, oldest first: `weeksBack` weeks before the current
 * one, then `weeksOn` weeks of which the current one is the first. Days outside of these weeks are left out.
 * @example dueWeeks([{ day: '2026-12-03', homes: 2 }], '2026-12-01', { weeksBack: 0, weeksOn: 1 })
 * // [{ monday: '2026-11-30', homes: 2, past: false }]
 */
export function dueWeeks(
  counts: readonly { day: CalendarDay; homes: number }[],
  today: CalendarDay,
  { weeksBack, weeksOn }: { weeksBack: number; weeksOn: number },
): DueWeek[] {
  const homesByMonday = new Map<CalendarDay, number>()
  for (const { day, homes } of counts) {
    const monday = mondayOf(day)
    homesByMonday.set(monday, (homesByMonday.get(monday) ?? 0) + homes)
  }
  const first = addDays(mondayOf(today), -7 * weeksBack)
  return Array.from({ length: weeksBack + weeksOn }, (_, week) => {
    const monday = addDays(first, 7 * week)
    return { monday, homes: homesByMonday.get(monday) ?? 0, past: addDays(monday, 6) < today }
  })
}
