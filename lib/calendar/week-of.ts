import { addDays } from './add-days'
import { type CalendarDay, calendarDay } from './calendar-day'
import { daysBetween } from './days-between'

/** A Monday to count weeks from. */
const A_MONDAY = calendarDay('2024-01-01')

/**
 * The Monday of the week that a day lies in; weeks run from Monday to Sunday.
 * @example mondayOf('2026-12-06') // '2026-11-30'
 */
export function mondayOf(day: CalendarDay): CalendarDay {
  const past = daysBetween(A_MONDAY, day) % 7
  return addDays(day, past < 0 ? -past - 7 : -past)
}
