/** A day in the calendar, without time or zone, as text that sorts in time order: `2026-12-01`. */

export type CalendarDay = string & { readonly __calendarDay: true }

const PATTERN = /^(\d{4})-(\d{2})-(\d{2})$/

/** Whether the year, month [1 to 12] and day [1 to 31] name a day of the Gregorian calendar. */
export function isRealDay(year: number, month: number, day: number): boolean {
  const date = new Date(Date.UTC(year, month - 1, day))
  return (
    year >= 1000 &&
    year <= 9999 &&
    date.getUTCFullYear() === year &&
    date.getUTCMonth() === month - 1 &&
    date.getUTCDate() === day
  )
}

/**
 * A calendar day from its parts.
 * @param month [1 to 12]
 * @throws RangeError where no such day exists
 * @example dayOf(2024, 2, 29) // '2024-02-29'
 */
export function dayOf(year: number, month: number, day: number): CalendarDay {
  if (!isRealDay(year, month, day)) throw new RangeError(`There is no day ${year}-${month}-${day}`)
  const two = (n: number) => String(n).padStart(2, '0')
  return `${year}-${two(month)}-${two(day)}` as CalendarDay
}

/**
 * A calendar day from its ISO 8601 text.
 * @throws RangeError where the text is not such a day
 * @example calendarDay('2026-12-01') // '2026-12-01'
 */
export function calendarDay(text: string): CalendarDay {
  const match = PATTERN.exec(text)
  if (!match) throw new RangeError(`Not a calendar day: ${text}`)
  return dayOf(Number(match[1]), Number(match[2]), Number(match[3]))
}

/** The year, month [1 to 12] and day of a calendar day. */
export function partsOf(day: CalendarDay): { year: number; month: number; day: number } {
  return { year: Number(day.slice(0, 4)), month: Number(day.slice(5, 7)), day: Number(day.slice(8, 10)) }
}
