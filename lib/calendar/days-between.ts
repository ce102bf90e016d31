import { type CalendarDay, partsOf } from './calendar-day'

const MILLISECONDS_IN_A_DAY = 86_400_000

function dayNumber(day: CalendarDay): number {
  const parts = partsOf(day)
  return Date.UTC(parts.year, parts.month - 1, parts.day) / MILLISECONDS_IN_A_DAY
}

/**
 * The number of days from one day to another [days]; negative where `to` comes first.
 * @example daysBetween('2026-10-31', '2026-12-01') // 31
 */
export function daysBetween(from: CalendarDay, to: CalendarDay): number {
  return dayNumber(to) - dayNumber(from)
}
