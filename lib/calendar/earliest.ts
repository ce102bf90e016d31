import { type CalendarDay } from './calendar-day'

/**
 * The earliest of some days; what is not there is passed over, and null where nothing is.
 * @example earliest('2029-02-28', null, '2027-01-01') // '2027-01-01'
 */
export function earliest(...days: (CalendarDay | null | undefined)[]): CalendarDay | null {
  let first: CalendarDay | null = null
  for (const day of days) if (day && (first === null || day < first)) first = day
  return first
}
