import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type InspectionRecord } from '@/lib/homes/standing'
import { type Cell } from './cell'
import { dateOfCell } from './date-of-cell'
import { found, type Reading, wrong } from './reading'

export type LastInspection = { readonly record: InspectionRecord; readonly date: PartialDate | null }

/**
 * When a home was last inspected: a date, the knowledge that there is no report, or nothing known.
 * @example readLastInspection('Aug 2021', today) // a dated record with the note 'date known to the month'
 * @example readLastInspection('12/11/2031', calendarDay('2026-12-01')) // why: 'date in the future'
 */
export function readLastInspection(cell: Cell, today: CalendarDay): Reading<LastInspection> {
  const date = dateOfCell(cell, Number(today.slice(0, 4)))
  if (date === 'never') return found({ record: 'never', date: null })
  if (date === 'unknown') return found({ record: 'unknown', date: null })
  if ('why' in date) return wrong(date.why)
  if ('unclear' in date) return found({ record: 'unknown', date: null }, 'no inspection date given')
  if (date.day > today) return wrong('date in the future')
  return found(
    { record: 'dated', date },
    date.precision === 'day' ? null : `date known to the ${date.precision}`,
  )
}
