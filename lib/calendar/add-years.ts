import { type CalendarDay, dayOf, isRealDay, partsOf } from './calendar-day'

/**
 * The anniversary `n` years [whole, may be negative] after a day. 29 February has its anniversary on
 * 28 February in a common year: the cautious reading, since it never gives a day too many.
 * @throws RangeError where the result leaves the years 1000 to 9999, or `n` is no whole number
 * @example addYears('2024-02-29', 5) // '2029-02-28'
 */
export function addYears(day: CalendarDay, n: number): CalendarDay {
  if (!Number.isInteger(n)) throw new RangeError(`Not a whole number of years: ${n}`)
  const parts = partsOf(day)
  const year = parts.year + n
  const lost = parts.month === 2 && parts.day === 29 && !isRealDay(year, 2, 29)
  return dayOf(year, parts.month, lost ? 28 : parts.day)
}
