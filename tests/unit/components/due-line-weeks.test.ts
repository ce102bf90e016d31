import { describe, expect, it } from 'vitest'
import {
  homesIn,
  monthMarks,
  roundHeight,
  stretchHref,
  stretchInWords,
} from '@/components/drawings/due-line-weeks'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { dueWeeks } from '@/lib/duties/due-weeks'
import { homeQueryOf } from '@/lib/homes/home-query'

const today = calendarDay('2026-12-01')
const counts = [
  { day: calendarDay('2026-12-01'), homes: 1 },
  { day: calendarDay('2026-12-09'), homes: 1_200 },
]
const weeks = dueWeeks(counts, today, { weeksBack: 4, weeksOn: 8 })

describe('a stretch of weeks', () => {
  it('is told by its Monday where it is one week, and by both ends where it is more', () => {
    expect(stretchInWords(weeks, { from: 4, to: 4 })).toBe('Week of 30 November 2026: 1 home')
    expect(stretchInWords(weeks, { from: 4, to: 5 })).toBe(
      '30 November 2026 to 13 December 2026: 1,201 homes',
    )
    expect(homesIn(weeks, { from: 4, to: 5 })).toBe(1_201)
  })

  it('leads to a list that the homes page reads back as the same days', () => {
    const url = new URL(stretchHref(weeks, { from: 4, to: 5 }), 'http://fuseward.example')
    const query = homeQueryOf(Object.fromEntries(url.searchParams))
    expect(url.pathname).toBe('/homes')
    expect([query.dueFrom, query.dueTo, query.sort, query.order]).toEqual([
      '2026-11-30',
      '2026-12-13',
      'due',
      'asc',
    ])
  })

  it('outside of the line is nothing', () => {
    expect(stretchInWords(weeks, { from: 40, to: 41 })).toBe('')
  })
})

describe('months', () => {
  it('stand at their first Monday, with the year beside January', () => {
    expect(monthMarks(weeks)).toEqual([
      { at: 0, name: 'Nov' },
      { at: 5, name: 'Dec' },
      { at: 9, name: 'Jan 2027' },
    ])
  })
})

describe('the height', () => {
  it.each([
    [0, 4],
    [4, 4],
    [5, 6],
    [10, 10],
    [11, 20],
    [61, 80],
    [100, 100],
    [999, 1000],
  ])('of a line whose tallest week is %i is %i', (most, height) => {
    expect(roundHeight(most)).toBe(height)
  })
})
