import { describe, expect, it } from 'vitest'
import { calendarDay, dayOf, isRealDay, partsOf } from '@/lib/calendar/calendar-day'

describe('a calendar day', () => {
  it('is read from its text and taken apart again', () => {
    expect(partsOf(calendarDay('2024-02-29'))).toEqual({ year: 2024, month: 2, day: 29 })
  })

  it.each([
    '2023-02-29',
    '1900-02-29',
    '2026-13-01',
    '2026-00-10',
    '2026-04-31',
    '2026-1-1',
    '01/12/2026',
    '',
  ])('is not %j', (text) => {
    expect(() => calendarDay(text)).toThrow(RangeError)
  })

  it.each([
    [2000, 2, 29, true],
    [2100, 2, 29, false],
    [999, 1, 1, false],
    [10_000, 1, 1, false],
    [2026, 6, 31, false],
    [2026, 1.5, 1, false],
    [Number.NaN, 1, 1, false],
  ])('%d-%d-%d is real: %s', (year, month, day, real) => {
    expect(isRealDay(year, month, day)).toBe(real)
  })

  it('pads its month and day, so that text order is time order', () => {
    expect(dayOf(2026, 9, 3)).toBe('2026-09-03')
    expect(dayOf(2026, 9, 3) < dayOf(2026, 10, 1)).toBe(true)
  })
})
