import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { partialDateInWords } from '@/lib/calendar/partial-date-in-words'
import { spanInWords } from '@/lib/calendar/span-in-words'
import { type Nation } from '@/lib/homes/nation'
import { type Standing } from '@/lib/homes/standing'
import { inspectedInWords, limitInWords, oftenInWords } from './interval-in-words'
import { intervalRule } from './interval-rules'
import { lastDayCovered } from './last-day-covered'
import { type Sector } from './sector'

/**
 * A standing as a label short enough for a table.
 * @example standingInWords({ standing: 'lapsed', dueOn: '2021-03-14', today: '2026-12-01' }) // 'Lapsed 5 y 8 m'
 * @example standingInWords({ standing: 'due', dueOn: '2026-12-18', today: '2026-12-01' }) // 'Due 18 Dec 2026'
 * @example standingInWords({ standing: 'in date', dueOn: '2028-08-02', today: '2026-12-01' }) // 'In date to Aug 2028'
 */
export function standingInWords({
  standing,
  dueOn,
  today,
}: {
  standing: Standing
  dueOn: CalendarDay | null
  today: CalendarDay
}): string {
  if (standing === 'never inspected') return 'Never inspected'
  if (standing === 'unknown date' || dueOn === null) return 'Unknown date'
  if (standing === 'lapsed') return `Lapsed ${spanInWords(dueOn, today, 'short')}`
  if (standing === 'due') return `Due ${partialDateInWords({ day: dueOn, precision: 'day' }, 'short')}`
  return `In date to ${partialDateInWords({ day: dueOn, precision: 'month' }, 'short')}`
}

const ENDINGS = {
  lapsed: (day: string) => `so it lapsed after ${day}`,
  due: (day: string) => `so the next inspection is due by ${day}`,
  'in date': (day: string) => `so it is in date to ${day}`,
}

/**
 * Why a home stands as it does: one sentence that names the law.
 * @param decidedBy found from the dates where it is left out
 * @param sector by {@link sectorOf}; the private sector's rules where it is left out
 * @example standingReason({ standing: 'lapsed', nation: 'england', inspectedOn: { day: '2016-03-14', precision: 'day' }, dueOn: '2021-03-14' })
 * // 'Inspected 14 March 2016; a report covers five years at most (SI 2020/312, reg 3(2)), so it lapsed after 14 March 2021.'
 */
export function standingReason({
  standing,
  nation,
  sector = 'private',
  inspectedOn,
  dueOn,
  decidedBy,
}: {
  standing: Standing
  nation: Nation
  sector?: Sector
  inspectedOn: PartialDate | null
  dueOn: CalendarDay | null
  decidedBy?: 'law' | 'report'
}): string {
  const rule = intervalRule(nation, sector)
  if (standing === 'never inspected') {
    return `On record as never inspected; ${oftenInWords(rule)}, so one is needed now.`
  }
  if (standing === 'unknown date' || inspectedOn === null || dueOn === null) {
    return `The date of the last inspection is not known; ${oftenInWords(rule)}, so the home cannot count as in date.`
  }
  const decider = decidedBy ?? (dueOn < lastDayCovered(rule, inspectedOn) ? 'report' : 'law')
  return `${inspectedInWords(inspectedOn)}; ${limitInWords(rule, decider)}, ${ENDINGS[standing](dayInWords(dueOn))}.`
}
