import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type Nation } from '@/lib/homes/nation'
import { inspectedInWords, limitInWords } from './interval-in-words'
import { type IntervalRule, intervalRule } from './interval-rules'
import { lastDayCovered } from './last-day-covered'
import { type Sector } from './sector'

/** The end of what a report covers, and what set it. */
export type InspectionDue = {
  /** the last day that the report covers */
  readonly dueOn: CalendarDay
  /** `report`: the report asks for the next inspection sooner than the rule does */
  readonly decidedBy: 'law' | 'report'
  readonly rule: IntervalRule
  /** one sentence that names the rule */
  readonly words: string
}

/**
 * When the next inspection is due: the last day of the interval, or the day that the report names where
 * that is sooner. A report may shorten the interval, never lengthen it. A next date that does not lie
 * after the inspection cannot be that report's, and is passed over.
 * @param reportSays the next inspection date that the report states, if any
 * @param sector by {@link sectorOf}; the private sector's rules where it is left out
 * @example inspectionDue('england', { day: '2021-12-14', precision: 'day' }, null).dueOn // '2026-12-14'
 */
export function inspectionDue(
  nation: Nation,
  inspected: PartialDate,
  reportSays: CalendarDay | null,
  sector: Sector = 'private',
): InspectionDue {
  const rule = intervalRule(nation, sector)
  const last = lastDayCovered(rule, inspected)
  const shortened = reportSays !== null && reportSays > inspected.day && reportSays < last
  const dueOn = shortened ? reportSays : last
  const decidedBy = shortened ? 'report' : 'law'
  const words = `${inspectedInWords(inspected)}; ${limitInWords(rule, decidedBy)}, so it covers the home to ${dayInWords(dueOn)}.`
  return { dueOn, decidedBy, rule, words }
}
