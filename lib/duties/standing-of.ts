import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type InspectionRecord, type Standing } from '@/lib/homes/standing'

/**
 * A home's duty state at a date. The last day that a report covers is still covered; a dated record
 * without a due day counts as an unknown date, never as in date.
 * @param noticeDays how long beforehand a home counts as due [days, 0 or more]
 * @example standingOf({ record: 'dated', dueOn: '2026-11-30', today: '2026-12-01', noticeDays: 60 }) // 'lapsed'
 */
export function standingOf({
  record,
  dueOn,
  today,
  noticeDays,
}: {
  record: InspectionRecord
  dueOn: CalendarDay | null
  today: CalendarDay
  noticeDays: number
}): Standing {
  if (record === 'never') return 'never inspected'
  if (record === 'unknown' || dueOn === null) return 'unknown date'
  if (dueOn < today) return 'lapsed'
  return dueOn <= addDays(today, noticeDays) ? 'due' : 'in date'
}
