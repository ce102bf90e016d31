import fc from 'fast-check'
import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay, dayOf } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'

const FIRST = dayOf(1900, 1, 1)

/** Any day from 1900 to 2173. */
export const anyDay: fc.Arbitrary<CalendarDay> = fc
  .integer({ min: 0, max: 100_000 })
  .map((days) => addDays(FIRST, days))

/** Any date known to the day, the month or the year. */
export const anyPartialDate: fc.Arbitrary<PartialDate> = fc
  .tuple(anyDay, fc.constantFrom('day' as const, 'month' as const, 'year' as const))
  .map(([day, precision]) => {
    if (precision === 'day') return { day, precision }
    return {
      day: dayOf(Number(day.slice(0, 4)), precision === 'year' ? 1 : Number(day.slice(5, 7)), 1),
      precision,
    }
  })
