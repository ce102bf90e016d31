import { type CalendarDay } from './calendar-day'
import { daysBetween } from './days-between'
import { wholeMonthsBetween } from './whole-months-between'

const UNITS = { day: 'd', week: 'w', month: 'm', year: 'y' } as const

/**
 * How long lies between two days, in either order, rounded down to what a person would say:
 * days up to a fortnight, then weeks up to two months, then months, then years and months.
 * @param style `short` abbreviates the units: d, w, m (months), y
 * @example spanInWords('2021-03-14', '2026-12-01') // '5 years 8 months'
 * @example spanInWords('2021-03-14', '2026-12-01', 'short') // '5 y 8 m'
 * @example spanInWords('2026-11-10', '2026-12-01') // '3 weeks'
 * @example spanInWords('2026-11-29', '2026-12-01') // '2 days'
 */
export function spanInWords(from: CalendarDay, to: CalendarDay, style: 'long' | 'short' = 'long'): string {
  const count = (n: number, unit: keyof typeof UNITS) =>
    style === 'short' ? `${n} ${UNITS[unit]}` : `${n} ${unit}${n === 1 ? '' : 's'}`
  const days = Math.abs(daysBetween(from, to))
  if (days < 14) return count(days, 'day')
  const months = wholeMonthsBetween(from, to)
  if (months < 2) return count(Math.floor(days / 7), 'week')
  if (months < 12) return count(months, 'month')
  const years = count(Math.floor(months / 12), 'year')
  return months % 12 === 0 ? years : `${years} ${count(months % 12, 'month')}`
}
