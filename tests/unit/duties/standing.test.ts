import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { addDays } from '@/lib/calendar/add-days'
import { calendarDay as d } from '@/lib/calendar/calendar-day'
import { standingInWords, standingReason } from '@/lib/duties/standing-in-words'
import { standingOf } from '@/lib/duties/standing-of'
import { anyDay } from '../calendar/any-day'

const today = d('2026-12-01')

describe('the standing of a home', () => {
  it.each([
    ['dated', '2026-11-30', 'lapsed'],
    ['dated', '2026-12-01', 'due'],
    ['dated', '2027-01-30', 'due'],
    ['dated', '2027-01-31', 'in date'],
    ['dated', null, 'unknown date'],
    ['unknown', null, 'unknown date'],
    ['unknown', '2030-01-01', 'unknown date'],
    ['never', null, 'never inspected'],
    ['never', '2030-01-01', 'never inspected'],
  ] as const)('record %s, due %s: %s', (record, due, standing) => {
    expect(standingOf({ record, dueOn: due === null ? null : d(due), today, noticeDays: 60 })).toBe(standing)
  })

  it('counts no home as due beforehand where the notice is 0 days', () => {
    expect(standingOf({ record: 'dated', dueOn: d('2026-12-02'), today, noticeDays: 0 })).toBe('in date')
    expect(standingOf({ record: 'dated', dueOn: today, today, noticeDays: 0 })).toBe('due')
  })

  it('only ever gets worse as time passes', () => {
    const order = ['in date', 'due', 'lapsed']
    fc.assert(
      fc.property(
        anyDay,
        anyDay,
        fc.nat({ max: 4000 }),
        fc.nat({ max: 400 }),
        (dueOn, now, later, noticeDays) => {
          const at = (day: typeof now) =>
            order.indexOf(standingOf({ record: 'dated', dueOn, today: day, noticeDays }))
          expect(at(now)).toBeGreaterThanOrEqual(0)
          expect(at(addDays(now, later))).toBeGreaterThanOrEqual(at(now))
        },
      ),
    )
  })
})

describe('the label of a standing', () => {
  it.each([
    ['lapsed', '2021-03-14', 'Lapsed 5 y 8 m'],
    ['lapsed', '2026-11-30', 'Lapsed 1 d'],
    ['due', '2026-12-18', 'Due 18 Dec 2026'],
    ['in date', '2028-08-02', 'In date to Aug 2028'],
    ['never inspected', null, 'Never inspected'],
    ['unknown date', null, 'Unknown date'],
  ] as const)('%s, %s: %s', (standing, due, words) => {
    expect(standingInWords({ standing, dueOn: due === null ? null : d(due), today })).toBe(words)
  })
})

describe('the reason of a standing', () => {
  const inspectedOn = { day: d('2016-03-14'), precision: 'day' } as const
  const dueOn = d('2021-03-14')

  it('names the inspection, the law and the outcome', () => {
    expect(
      standingReason({ standing: 'lapsed', nation: 'england', inspectedOn, dueOn, decidedBy: 'law' }),
    ).toBe(
      'Inspected 14 March 2016; a report covers five years at most (SI 2020/312, reg 3(2)), so it lapsed after 14 March 2021.',
    )
    expect(standingReason({ standing: 'due', nation: 'england', inspectedOn, dueOn })).toMatch(
      /so the next inspection is due by 14 March 2021\.$/,
    )
    expect(
      standingReason({ standing: 'in date', nation: 'wales', inspectedOn, dueOn: d('2021-03-13') }),
    ).toBe(
      'Inspected 14 March 2016; a report covers five years at most (WSI 2022/6, reg 6(2)(b)), so it is in date to 13 March 2021.',
    )
  })

  it('finds out by itself that the report decided', () => {
    const reason = standingReason({
      standing: 'lapsed',
      nation: 'england',
      inspectedOn,
      dueOn: d('2019-03-14'),
    })
    expect(reason).toContain('the report asks for the next inspection sooner than the five years')
    expect(reason).toMatch(/so it lapsed after 14 March 2019\.$/)
  })

  it('says what is owed where there is no date', () => {
    expect(
      standingReason({ standing: 'never inspected', nation: 'england', inspectedOn: null, dueOn: null }),
    ).toBe(
      'On record as never inspected; an inspection is owed every five years at least (SI 2020/312, reg 3(2)), so one is needed now.',
    )
    expect(
      standingReason({ standing: 'unknown date', nation: 'scotland', inspectedOn: null, dueOn: null }),
    ).toBe(
      'The date of the last inspection is not known; an inspection is owed every five years at least (Housing (Scotland) Act 2006, s.19A(2)), so the home cannot count as in date.',
    )
    const practice = { nation: 'northern-ireland', sector: 'social', inspectedOn: null, dueOn: null } as const
    expect(standingReason({ standing: 'never inspected', ...practice })).toContain(
      'an inspection is good practice every five years',
    )
  })
})
