import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  addDays as dateFnsAddDays,
  addYears as dateFnsAddYears,
  differenceInCalendarDays,
  format,
  parseISO,
  startOfWeek,
} from 'date-fns'
import { addDays } from '@/lib/calendar/add-days'
import { addYears } from '@/lib/calendar/add-years'
import { calendarDay as d, partsOf } from '@/lib/calendar/calendar-day'
import { daysBetween } from '@/lib/calendar/days-between'
import { earliest } from '@/lib/calendar/earliest'
import { latestOf } from '@/lib/calendar/partial-date'
import { mondayOf } from '@/lib/calendar/week-of'
import { wholeMonthsBetween } from '@/lib/calendar/whole-months-between'
import { anyDay, anyPartialDate } from './any-day'

const iso = (date: Date) => format(date, 'yyyy-MM-dd')

describe('adding days', () => {
  it('crosses months, years and leap days', () => {
    expect(addDays(d('2026-12-03'), 28)).toBe('2026-12-31')
    expect(addDays(d('2024-02-28'), 2)).toBe('2024-03-01')
    expect(addDays(d('2027-01-01'), -1)).toBe('2026-12-31')
  })

  it('agrees with date-fns 4, which knows nothing of us', () => {
    fc.assert(
      fc.property(anyDay, fc.integer({ min: -20_000, max: 20_000 }), (day, n) => {
        expect(addDays(day, n)).toBe(iso(dateFnsAddDays(parseISO(day), n)))
      }),
    )
  })

  it('is undone by taking the days away, and counted by the days between', () => {
    fc.assert(
      fc.property(anyDay, fc.integer({ min: -20_000, max: 20_000 }), (day, n) => {
        expect(addDays(addDays(day, n), -n)).toBe(day)
        expect(daysBetween(day, addDays(day, n))).toBe(n)
      }),
    )
  })

  it('refuses half days and days outside of four-digit years', () => {
    expect(() => addDays(d('2026-12-01'), 0.5)).toThrow(RangeError)
    expect(() => addDays(d('2026-12-01'), Number.NaN)).toThrow(RangeError)
    expect(() => addDays(d('9999-12-31'), 1)).toThrow(RangeError)
  })
})

describe('adding years', () => {
  it.each([
    ['2024-02-29', 5, '2029-02-28'],
    ['2024-02-29', 4, '2028-02-29'],
    ['2024-02-28', 5, '2029-02-28'],
    ['2023-03-01', 5, '2028-03-01'],
    ['2026-12-01', -5, '2021-12-01'],
  ])('%s and %i years is %s', (day, n, expected) => {
    expect(addYears(d(day), n)).toBe(expected)
  })

  it('agrees with date-fns 4', () => {
    fc.assert(
      fc.property(anyDay, fc.integer({ min: -40, max: 40 }), (day, n) => {
        expect(addYears(day, n)).toBe(iso(dateFnsAddYears(parseISO(day), n)))
      }),
    )
  })

  it('never gives a later day than the same month and day of that year, nor another month', () => {
    fc.assert(
      fc.property(anyDay, fc.integer({ min: -40, max: 40 }), (day, n) => {
        const was = partsOf(day)
        const is = partsOf(addYears(day, n))
        expect(is.year).toBe(was.year + n)
        expect(is.month).toBe(was.month)
        expect(is.day).toBeLessThanOrEqual(was.day)
        expect(was.day - is.day).toBeLessThanOrEqual(1)
      }),
    )
  })

  it('refuses half years', () => {
    expect(() => addYears(d('2026-12-01'), 1.5)).toThrow(RangeError)
  })
})

describe('days and months between', () => {
  it('counts days either way, and over the change of the clocks', () => {
    expect(daysBetween(d('2026-10-31'), d('2026-12-01'))).toBe(31)
    expect(daysBetween(d('2026-12-01'), d('2026-10-31'))).toBe(-31)
    expect(daysBetween(d('2026-03-28'), d('2026-03-30'))).toBe(2)
  })

  it('agrees with date-fns 4', () => {
    fc.assert(
      fc.property(anyDay, anyDay, (one, other) => {
        expect(daysBetween(one, other)).toBe(differenceInCalendarDays(parseISO(other), parseISO(one)))
      }),
    )
  })

  it.each([
    ['2021-03-14', '2026-12-01', 68],
    ['2026-01-31', '2026-02-28', 0],
    ['2026-01-31', '2026-03-31', 2],
    ['2026-12-01', '2026-12-01', 0],
    ['2026-12-01', '2021-03-14', 68],
  ])('from %s to %s are %i whole months', (one, other, months) => {
    expect(wholeMonthsBetween(d(one), d(other))).toBe(months)
  })
})

describe('the earliest day', () => {
  it('passes over what is not there', () => {
    expect(earliest(d('2029-02-28'), null, d('2027-01-01'), undefined)).toBe('2027-01-01')
    expect(earliest(null, undefined)).toBeNull()
    expect(earliest()).toBeNull()
  })
})

describe('the Monday of a week', () => {
  it.each([
    ['2026-11-30', '2026-11-30'],
    ['2026-12-01', '2026-11-30'],
    ['2026-12-06', '2026-11-30'],
    ['2026-12-07', '2026-12-07'],
    ['2023-12-31', '2023-12-25'],
  ])('of %s is %s', (day, monday) => {
    expect(mondayOf(d(day))).toBe(monday)
  })

  it('agrees with date-fns 4', () => {
    fc.assert(
      fc.property(anyDay, (day) => {
        expect(mondayOf(day)).toBe(iso(startOfWeek(parseISO(day), { weekStartsOn: 1 })))
      }),
    )
  })
})

describe('a partly known date', () => {
  it.each([
    ['2021-02-01', 'month', '2021-02-28'],
    ['2024-02-01', 'month', '2024-02-29'],
    ['2021-01-01', 'year', '2021-12-31'],
    ['2021-05-17', 'day', '2021-05-17'],
  ] as const)('%s known to the %s ends on %s', (day, precision, last) => {
    expect(latestOf({ day: d(day), precision })).toBe(last)
  })

  it('never ends before it begins', () => {
    fc.assert(fc.property(anyPartialDate, (date) => latestOf(date) >= date.day))
  })
})
