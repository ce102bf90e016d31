import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { addDays } from '@/lib/calendar/add-days'
import { calendarDay as d } from '@/lib/calendar/calendar-day'
import { dueWeeks } from '@/lib/duties/due-weeks'
import { anyDay } from '../calendar/any-day'

describe('the weeks of the due line', () => {
  it('sums the homes of each week from Monday to Sunday', () => {
    const counts = [
      { day: d('2026-11-29'), homes: 4 },
      { day: d('2026-11-30'), homes: 1 },
      { day: d('2026-12-06'), homes: 2 },
      { day: d('2026-12-07'), homes: 8 },
    ]
    expect(dueWeeks(counts, d('2026-12-01'), { weeksBack: 1, weeksOn: 3 })).toEqual([
      { monday: '2026-11-23', homes: 4, past: true },
      { monday: '2026-11-30', homes: 3, past: false },
      { monday: '2026-12-07', homes: 8, past: false },
      { monday: '2026-12-14', homes: 0, past: false },
    ])
  })

  it('keeps the current week from being past on its Sunday, and not on the Monday after', () => {
    const past = (today: string) =>
      dueWeeks([], d(today), { weeksBack: 1, weeksOn: 1 }).map(
        ({ monday, past: gone }) => `${monday} ${gone}`,
      )
    expect(past('2026-12-06')).toEqual(['2026-11-23 true', '2026-11-30 false'])
    expect(past('2026-12-07')).toEqual(['2026-11-30 true', '2026-12-07 false'])
  })

  it('leaves out what lies outside', () => {
    const counts = [
      { day: d('2020-01-01'), homes: 1 },
      { day: d('2030-01-01'), homes: 1 },
    ]
    expect(dueWeeks(counts, d('2026-12-01'), { weeksBack: 0, weeksOn: 2 }).map((week) => week.homes)).toEqual(
      [0, 0],
    )
  })

  it('splits past from present at the same place for any day', () => {
    fc.assert(
      fc.property(
        anyDay,
        fc.nat({ max: 60 }),
        fc.integer({ min: 1, max: 60 }),
        (today, weeksBack, weeksOn) => {
          const weeks = dueWeeks([{ day: today, homes: 7 }], today, { weeksBack, weeksOn })
          expect(weeks).toHaveLength(weeksBack + weeksOn)
          expect(weeks.filter((week) => week.past)).toHaveLength(weeksBack)
          expect(weeks[weeksBack]?.homes).toBe(7)
          weeks.forEach((week, at) => expect(week.monday).toBe(addDays(weeks[0]?.monday ?? today, 7 * at)))
        },
      ),
    )
  })
})
