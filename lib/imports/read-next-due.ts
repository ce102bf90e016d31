import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Cell } from './cell'
import { isDateSerial } from './cell-text'
import { dateOfCell } from './date-of-cell'
import { found, type Reading, wrong } from './reading'

/** A report asks for the next inspection within ten years; twice that is a slip of the keyboard [our judgement]. */
const YEARS_AHEAD = 20

/**
 * The next inspection date that the report states, or null. A partly known one counts from its first day.
 * @param inspected whether the row has an inspection date: a formula that adds five years to a blank gives a day in 1904
 * @example readNextDue('June 2027', today, true) // '2027-06-01' with a note
 */
export function readNextDue(cell: Cell, today: CalendarDay, inspected: boolean): Reading<CalendarDay | null> {
  const thisYear = Number(today.slice(0, 4))
  const date = dateOfCell(cell, thisYear)
  if (date === 'never' || date === 'unknown') return found(null)
  if ('unclear' in date) return found(null, 'no next due date given')
  if ('why' in date) {
    const fromBlank = !inspected && (isDateSerial(cell) || typeof cell === 'number')
    return fromBlank ? found(null, 'next due worked out from a blank date') : wrong(date.why)
  }
  if (Number(date.day.slice(0, 4)) > thisYear + YEARS_AHEAD) return wrong('date too far ahead')
  return found(date.day, date.precision === 'day' ? null : `next due known to the ${date.precision}`)
}
