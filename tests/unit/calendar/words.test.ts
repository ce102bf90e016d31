import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { addDays } from '@/lib/calendar/add-days'
import { calendarDay as d } from '@/lib/calendar/calendar-day'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { monthName } from '@/lib/calendar/month-names'
import { partialDateInWords } from '@/lib/calendar/partial-date-in-words'
import { spanInWords } from '@/lib/calendar/span-in-words'
import { anyDay } from './any-day'

describe('a date in words', () => {
  it.each([
    ['day', 'long', '1 December 2026'],
    ['day', 'short', '1 Dec 2026'],
    ['month', 'long', 'December 2026'],
    ['month', 'short', 'Dec 2026'],
    ['year', 'long', '2026'],
    ['year', 'short', '2026'],
  ] as const)('known to the %s, %s: %s', (precision, style, words) => {
    expect(partialDateInWords({ day: d('2026-12-01'), precision }, style)).toBe(words)
  })

  it('agrees with the British English of the platform’s own Intl', () => {
    const british = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' })
    fc.assert(
      fc.property(anyDay, (day) => {
        expect(dayInWords(day)).toBe(british.format(Date.parse(day)))
      }),
    )
  })

  it('has twelve months', () => {
    expect(monthName(9, 'short')).toBe('Sep')
    expect(() => monthName(13, 'long')).toThrow(RangeError)
    expect(() => monthName(0, 'long')).toThrow(RangeError)
  })
})

describe('a span in words', () => {
  it.each([
    ['2021-03-14', '2026-12-01', '5 years 8 months', '5 y 8 m'],
    ['2025-12-01', '2026-12-01', '1 year', '1 y'],
    ['2025-11-01', '2026-12-01', '1 year 1 month', '1 y 1 m'],
    ['2026-04-01', '2026-12-01', '8 months', '8 m'],
    ['2026-10-01', '2026-12-01', '2 months', '2 m'],
    ['2026-10-02', '2026-12-01', '8 weeks', '8 w'],
    ['2026-11-10', '2026-12-01', '3 weeks', '3 w'],
    ['2026-11-17', '2026-12-01', '2 weeks', '2 w'],
    ['2026-11-18', '2026-12-01', '13 days', '13 d'],
    ['2026-11-29', '2026-12-01', '2 days', '2 d'],
    ['2026-11-30', '2026-12-01', '1 day', '1 d'],
    ['2026-12-01', '2026-12-01', '0 days', '0 d'],
    ['2026-12-18', '2026-12-01', '2 weeks', '2 w'],
  ])('%s to %s: %s', (from, to, long, short) => {
    expect(spanInWords(d(from), d(to))).toBe(long)
    expect(spanInWords(d(from), d(to), 'short')).toBe(short)
  })

  it('is the same in either order', () => {
    fc.assert(
      fc.property(anyDay, fc.nat({ max: 9000 }), (day, n) => {
        expect(spanInWords(day, addDays(day, n))).toBe(spanInWords(addDays(day, n), day))
      }),
    )
  })
})
