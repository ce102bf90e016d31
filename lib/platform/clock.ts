/** The one place that asks what time it is. Pure subjects are handed the answer. */
import { tz } from '@date-fns/tz'
import { format } from 'date-fns'
import { type CalendarDay, calendarDay } from '@/lib/calendar/calendar-day'
import { env } from './env'

const LONDON = tz('Europe/London')

export const now = (): Date => new Date()

/** Today in Europe/London, or the day that a demo is pinned to. */
export function today(): CalendarDay {
  return calendarDay(env().FUSEWARD_TODAY ?? format(now(), 'yyyy-MM-dd', { in: LONDON }))
}
