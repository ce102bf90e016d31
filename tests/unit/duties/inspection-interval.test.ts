import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { addYears } from '@/lib/calendar/add-years'
import { calendarDay as d } from '@/lib/calendar/calendar-day'
import { latestOf } from '@/lib/calendar/partial-date'
import { inspectionDue } from '@/lib/duties/inspection-interval'
import { SECTORS, sectorOf } from '@/lib/duties/sector'
import { NATIONS } from '@/lib/homes/nation'
import { TENURES } from '@/lib/homes/tenure'
import { anyDay, anyPartialDate } from '../calendar/any-day'

const anyNation = fc.constantFrom(...NATIONS)
const anySector = fc.constantFrom(...SECTORS)
const inspected = { day: d('2024-03-14'), precision: 'day' } as const

describe('the day that the next inspection is due', () => {
  it('is never later than the fifth anniversary of any day that the inspection can have been on', () => {
    fc.assert(
      fc.property(
        anyNation,
        anySector,
        anyPartialDate,
        fc.option(anyDay),
        (nation, sector, date, reportSays) => {
          const { dueOn } = inspectionDue(nation, date, reportSays, sector)
          expect(dueOn <= addYears(date.day, 5)).toBe(true)
          expect(dueOn <= addYears(latestOf(date), 5)).toBe(true)
          expect(dueOn > date.day).toBe(true)
        },
      ),
    )
  })

  it('is never put off by what a report says', () => {
    fc.assert(
      fc.property(anyNation, anyPartialDate, anyDay, (nation, date, reportSays) => {
        const withReport = inspectionDue(nation, date, reportSays)
        const without = inspectionDue(nation, date, null)
        expect(withReport.dueOn <= without.dueOn).toBe(true)
        expect(withReport.decidedBy).toBe(withReport.dueOn < without.dueOn ? 'report' : 'law')
      }),
    )
  })

  it('passes over a next date that does not lie after the inspection', () => {
    expect(inspectionDue('england', inspected, d('2024-03-14'))).toMatchObject({
      dueOn: '2029-03-14',
      decidedBy: 'law',
    })
    expect(inspectionDue('england', inspected, d('2019-03-14'))).toMatchObject({
      dueOn: '2029-03-14',
      decidedBy: 'law',
    })
    expect(inspectionDue('england', inspected, d('2024-03-15'))).toMatchObject({
      dueOn: '2024-03-15',
      decidedBy: 'report',
    })
  })

  it('is told in one sentence that names the law', () => {
    expect(inspectionDue('england', inspected, null).words).toBe(
      'Inspected 14 March 2024; a report covers five years at most (SI 2020/312, reg 3(2)), so it covers the home to 14 March 2029.',
    )
    expect(inspectionDue('wales', inspected, d('2025-03-14')).words).toBe(
      'Inspected 14 March 2024; the report asks for the next inspection sooner than the five years it may cover at most (WSI 2022/6, reg 6(2)(b)), so it covers the home to 14 March 2025.',
    )
    expect(
      inspectionDue('scotland', { day: d('2024-03-01'), precision: 'month' }, null, 'social').words,
    ).toBe(
      'Inspected in March 2024, counted from 1 March 2024; a report covers five years at most (Scottish Housing Quality Standard, element 45), so it covers the home to 1 March 2029.',
    )
    expect(
      inspectionDue('northern-ireland', { day: d('2024-01-01'), precision: 'year' }, null, 'social').words,
    ).toBe(
      'Inspected in 2024, counted from 1 January 2024; a report covers five years at most (good practice, the interval of SR 2024/201, which binds private landlords), so it covers the home to 1 January 2029.',
    )
  })
})

describe('the sector of a tenure', () => {
  it('is social for social and affordable rent alone', () => {
    expect(TENURES.filter((tenure) => sectorOf(tenure) === 'social')).toEqual([
      'social-rent',
      'affordable-rent',
    ])
  })
})
