/** A date known to the day, the month or the year: what a spreadsheet or a memory really holds. */
import { type CalendarDay, dayOf, partsOf } from './calendar-day'

export const PRECISIONS = ['day', 'month', 'year'] as const
export type Precision = (typeof PRECISIONS)[number]

/** `day` is the first day that the date could be; `precision` says how far it is known. */
export type PartialDate = { readonly day: CalendarDay; readonly precision: Precision }

/**
 * The last day that a partly known date could be.
 * @example latestOf({ day: '2021-02-01', precision: 'month' }) // '2021-02-28'
 */
export function latestOf(date: PartialDate): CalendarDay {
  const { year, month } = partsOf(date.day)
  if (date.precision === 'day') return date.day
  if (date.precision === 'year') return dayOf(year, 12, 31)
  return dayOf(year, month, new Date(Date.UTC(year, month, 0)).getUTCDate())
}
