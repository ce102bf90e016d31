import { addDays } from '@/lib/calendar/add-days'
import { addYears } from '@/lib/calendar/add-years'
import { type CalendarDay, partsOf } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type IntervalRule } from './interval-rules'

/**
 * The last day that a rule lets a report cover. A date known to the month or the year counts from its
 * first day: what is not known is never good news.
 * @example lastDayCovered(intervalRule('england', 'private'), { day: '2024-02-29', precision: 'day' }) // '2029-02-28'
 * @example lastDayCovered(intervalRule('wales', 'private'), { day: '2021-12-14', precision: 'day' }) // '2026-12-13'
 */
export function lastDayCovered(rule: IntervalRule, inspected: PartialDate): CalendarDay {
  const anniversary = addYears(inspected.day, rule.years)
  if (rule.dayRule === 'anniversary') return anniversary
  // Five years that begin with 29 February end with 28 February: the anniversary has lost its day already.
  const lostItsDay = partsOf(anniversary).day !== partsOf(inspected.day).day
  return lostItsDay ? anniversary : addDays(anniversary, -1)
}
