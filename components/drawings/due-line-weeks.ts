import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay, partsOf } from '@/lib/calendar/calendar-day'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { monthName } from '@/lib/calendar/month-names'
import { type DueWeek } from '@/lib/duties/due-weeks'

/** A week of the due line; `booked` of its homes have a visit booked, where bookings are kept. */
export type DueLineWeek = DueWeek & { readonly booked?: number }

/** A stretch of weeks, first and last place in the line. */
export type Stretch = { readonly from: number; readonly to: number }

export const homesIn = (weeks: readonly DueLineWeek[], { from, to }: Stretch): number =>
  weeks.slice(from, to + 1).reduce((sum, week) => sum + week.homes, 0)

const count = (homes: number) => (homes === 1 ? '1 home' : `${homes.toLocaleString('en-GB')} homes`)

/**
 * A stretch of weeks in words.
 * @example stretchInWords(weeks, { from: 13, to: 13 }) // 'Week of 30 November 2026: 12 homes'
 */
export function stretchInWords(weeks: readonly DueLineWeek[], stretch: Stretch): string {
  const first = weeks[stretch.from]
  const last = weeks[stretch.to]
  if (!first || !last) return ''
  const when =
    stretch.from === stretch.to
      ? `Week of ${dayInWords(first.monday)}`
      : `${dayInWords(first.monday)} to ${dayInWords(addDays(last.monday, 6))}`
  return `${when}: ${count(homesIn(weeks, stretch))}`
}

/** The list of the homes that fall due in a stretch of weeks. */
export function stretchHref(weeks: readonly DueLineWeek[], { from, to }: Stretch): string {
  const first = weeks[from]
  const last = weeks[to]
  return first && last
    ? `/homes?dueFrom=${first.monday}&dueTo=${addDays(last.monday, 6)}&duty=owed&sort=due&order=asc`
    : '/homes'
}

/** The week that holds the first Monday of each month [place in the line], and its name; the year beside January. */
export function monthMarks(
  weeks: readonly { monday: CalendarDay }[],
): readonly { at: number; name: string }[] {
  return weeks.flatMap(({ monday }, at) => {
    const { year, month, day } = partsOf(monday)
    if (day > 7) return []
    return [{ at, name: month === 1 ? `${monthName(1, 'short')} ${year}` : monthName(month, 'short') }]
  })
}

/**
 * The height that the line is drawn to: the next round number at or above the tallest week.
 * @example roundHeight(61) // 80
 */
export function roundHeight(most: number): number {
  if (most <= 4) return 4
  const power = 10 ** Math.floor(Math.log10(most))
  return ([1, 2, 4, 6, 8, 10].find((step) => step * power >= most) ?? 10) * power
}
