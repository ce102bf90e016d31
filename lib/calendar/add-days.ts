import { type CalendarDay, dayOf, partsOf } from './calendar-day'

/**
 * The day that lies `n` days [whole, may be negative] after a day.
 * @throws RangeError where the result leaves the years 1000 to 9999, or `n` is no whole number
 * @example addDays('2026-12-03', 28) // '2026-12-31'
 */
export function addDays(day: CalendarDay, n: number): CalendarDay {
  if (!Number.isInteger(n)) throw new RangeError(`Not a whole number of days: ${n}`)
  const parts = partsOf(day)
  const date = new Date(Date.UTC(parts.year, parts.month - 1, parts.day + n))
  return dayOf(date.getUTCFullYear(), date.getUTCMonth() + 1, date.getUTCDate())
}
