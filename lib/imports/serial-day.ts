import { type CalendarDay } from '@/lib/calendar/calendar-day'

const MILLISECONDS_A_DAY = 86_400_000
/** Serial 1 is 1900-01-01, but the workbook's calendar holds a 29 February 1900 that never was, so day 0 moves. */
const DAY_ZERO = { 1900: Date.UTC(1899, 11, 30), 1904: Date.UTC(1904, 0, 1) } as const

/**
 * The day of a workbook's date serial; the time of day is dropped. Null where it names none.
 * @param serial [days]
 * @source ECMA-376 Part 1, 18.17.4.1 dates and times
 * @example serialDay(44878, 1900) // '2022-11-13'
 * @example serialDay(0, 1900) // null
 */
export function serialDay(serial: number, epoch: 1900 | 1904): CalendarDay | null {
  if (!(serial >= 1) || serial > 2_958_465) return null
  const date = new Date(DAY_ZERO[epoch] + Math.floor(serial) * MILLISECONDS_A_DAY)
  const text = date.toISOString().slice(0, 10)
  return /^\d{4}-/.test(text) ? (text as CalendarDay) : null
}
