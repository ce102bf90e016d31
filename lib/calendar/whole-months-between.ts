import { type CalendarDay, partsOf } from './calendar-day'

/**
 * The whole months [months, 0 or more] that have passed between two days, in either order.
 * @example wholeMonthsBetween('2021-03-14', '2026-12-01') // 68
 */
export function wholeMonthsBetween(one: CalendarDay, other: CalendarDay): number {
  const from = partsOf(one < other ? one : other)
  const to = partsOf(one < other ? other : one)
  const months = (to.year - from.year) * 12 + to.month - from.month
  return to.day < from.day ? months - 1 : months
}
