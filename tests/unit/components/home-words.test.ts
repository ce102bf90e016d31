import { describe, expect, it } from 'vitest'
import { ageInWords } from '@/components/homes/home-defects-card'
import { mapAround } from '@/components/homes/home-place-card'
import { dateWithPrecision } from '@/components/homes/home-provenance'
import { countOf, momentInWords, ordinal, stepsInWords } from '@/components/homes/home-words'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { TODAY, onDay } from './home-shown-example'

describe('words of a home', () => {
  it('puts places in order as English does, the teens among them', () => {
    // common practice, no source
    expect([1, 2, 3, 4, 11, 12, 13, 21, 22, 103, 111, 1112, 2423].map(ordinal)).toEqual([
      ...['1st', '2nd', '3rd', '4th', '11th', '12th', '13th', '21st', '22nd', '103rd', '111th', '1,112th'],
      '2,423rd',
    ])
  })

  it('gives steps a sign and one place, and none to what rounds to nothing', () => {
    expect([3, -1, 2.25, 0.04, -0.04, 0].map(stepsInWords)).toEqual([
      '+3.0',
      '−1.0',
      '+2.3',
      '0.0',
      '0.0',
      '0.0',
    ])
  })

  it('takes a moment to the day that it was in London, in summer and in winter', () => {
    // British Summer Time is UTC+1 (Summer Time Act 1972): half past eleven at night in UTC is the next day
    expect(momentInWords(new Date('2026-06-30T23:30:00Z'))).toBe('1 July 2026')
    expect(momentInWords(new Date('2026-12-31T23:30:00Z'))).toBe('31 December 2026')
  })

  it('counts one and many', () => {
    expect([0, 1, 2412].map((n) => countOf(n, 'home'))).toEqual(['0 homes', '1 home', '2,412 homes'])
  })

  it('says how far a date is known', () => {
    expect(dateWithPrecision(onDay('2016-03-14'))).toBe('14 March 2016')
    expect(dateWithPrecision({ day: calendarDay('2016-03-01'), precision: 'month' })).toBe(
      'some day in March 2016',
    )
    expect(dateWithPrecision(null)).toBe('date not known')
  })

  it('tells the age of a defect no more exactly than its date is known', () => {
    expect(ageInWords({ raisedOn: onDay('2026-11-30') }, TODAY)).toBe('open for 1 day')
    expect(ageInWords({ raisedOn: onDay('2026-12-01') }, TODAY)).toBe('open since today')
    expect(ageInWords({ raisedOn: { day: calendarDay('2026-11-01'), precision: 'month' } }, TODAY)).toBe(
      'open for up to 30 days',
    )
    expect(ageInWords({ raisedOn: null }, TODAY)).toContain('not known')
  })

  it('frames the map so that west, south, east and north stand in that order, the home in the middle', () => {
    const [west, south, east, north] = (mapAround({ latitude: 54, longitude: 2 }).split('=')[1] ?? '')
      .split(',')
      .map(Number)
    expect(((west ?? 0) + (east ?? 0)) / 2).toBeCloseTo(2, 6)
    expect(((south ?? 0) + (north ?? 0)) / 2).toBeCloseTo(54, 6)
    expect(west).toBeLessThan(east ?? 0)
    expect(south).toBeLessThan(north ?? 0)
  })
})
