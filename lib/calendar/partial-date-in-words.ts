import { partsOf } from './calendar-day'
import { monthName } from './month-names'
import { type PartialDate } from './partial-date'

/**
 * A date in words, no further than it is known.
 * @example partialDateInWords({ day: '2026-12-01', precision: 'day' }) // '1 December 2026'
 * @example partialDateInWords({ day: '2026-12-01', precision: 'month' }, 'short') // 'Dec 2026'
 * @example partialDateInWords({ day: '2026-01-01', precision: 'year' }) // '2026'
 */
export function partialDateInWords(date: PartialDate, style: 'long' | 'short' = 'long'): string {
  const { year, month, day } = partsOf(date.day)
  if (date.precision === 'year') return String(year)
  if (date.precision === 'month') return `${monthName(month, style)} ${year}`
  return `${day} ${monthName(month, style)} ${year}`
}
