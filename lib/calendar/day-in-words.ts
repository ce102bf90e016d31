import { type CalendarDay } from './calendar-day'
import { partialDateInWords } from './partial-date-in-words'

/**
 * A day in words.
 * @example dayInWords('2026-12-01') // '1 December 2026'
 */
export function dayInWords(day: CalendarDay): string {
  return partialDateInWords({ day, precision: 'day' })
}
