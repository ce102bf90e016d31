// Dates as typed in the United Kingdom: common practice, no source. Serials: ECMA-376 Part 1, 18.17.4.1.
import { describe, expect, it } from 'vitest'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { type Cell } from '@/lib/imports/cell'
import { readLastInspection } from '@/lib/imports/read-last-inspection'
import { readNextDue } from '@/lib/imports/read-next-due'
import { serialDay } from '@/lib/imports/serial-day'
import { readingOf } from './reading-of'

const today = calendarDay('2026-12-01')

describe('the last inspection', () => {
  it.each<[Cell, string, string]>([
    ['03/05/2020', '2020-05-03', 'day'],
    ['3/5/20', '2020-05-03', 'day'],
    ['03.05.2020', '2020-05-03', 'day'],
    ['11.06.22', '2022-06-11', 'day'],
    ['03-05-2020', '2020-05-03', 'day'],
    ['12/03/97', '1997-03-12', 'day'],
    ['3 August 2023', '2023-08-03', 'day'],
    ['3-Aug-23', '2023-08-03', 'day'],
    ['03Aug2023', '2023-08-03', 'day'],
    ['Thu 3 Aug 2023', '2023-08-03', 'day'],
    ['1st June 2020', '2020-06-01', 'day'],
    ['22nd of Sept 2021', '2021-09-22', 'day'],
    ['August 3, 2023', '2023-08-03', 'day'],
    ['2020-05-03', '2020-05-03', 'day'],
    ['2020-05-03T00:00:00.000Z', '2020-05-03', 'day'],
    ['03/05/2020 14:30', '2020-05-03', 'day'],
    ['20200503', '2020-05-03', 'day'],
    ['29/02/2024', '2024-02-29', 'day'],
    [{ serial: 44878, epoch: 1900 }, '2022-11-13', 'day'],
    [{ serial: 44878.75, epoch: 1900 }, '2022-11-13', 'day'],
    [{ serial: 43416, epoch: 1904 }, '2022-11-13', 'day'],
    [44878, '2022-11-13', 'day'],
    ['44878', '2022-11-13', 'day'],
    ['Aug 2021', '2021-08-01', 'month'],
    ["Aug '21", '2021-08-01', 'month'],
    ['August-2021', '2021-08-01', 'month'],
    ['03/2021', '2021-03-01', 'month'],
    ['2021-03', '2021-03-01', 'month'],
    ['2023', '2023-01-01', 'year'],
    [2023, '2023-01-01', 'year'],
    ['c. 2019', '2019-01-01', 'year'],
    ['early 2021', '2021-01-01', 'year'],
    ['2020.0', '2020-01-01', 'year'],
    ['Q3 2021', '2021-07-01', 'year'],
  ])('%j is %s, known to the %s', (cell, day, precision) => {
    expect(readLastInspection(cell, today)).toEqual({
      ok: true,
      value: { record: 'dated', date: { day, precision } },
      note: precision === 'day' ? null : `date known to the ${precision}`,
    })
  })

  it.each(['Never', 'none on file', 'no EICR', 'None', 'no record', 'not done', 'no cert held'])(
    '%j: there is no report',
    (cell) => {
      expect(readingOf(readLastInspection(cell, today))).toEqual({ record: 'never', date: null })
    },
  )

  it.each(['', '?', 'n/k', 'TBC', 'unknown', 'N/A', '-', null])('%j: nothing is known', (cell) => {
    expect(readLastInspection(cell, today)).toEqual({
      ok: true,
      value: { record: 'unknown', date: null },
      note: null,
    })
  })

  it.each(['no access x2', 'booked', 'overdue', 'pending', 'yes'])('%j: no date, with a note', (cell) => {
    expect(readLastInspection(cell, today)).toMatchObject({
      value: { record: 'unknown' },
      note: 'no inspection date given',
    })
  })

  it.each<[Cell, string]>([
    ['31/02/2020', 'impossible date'],
    ['29/02/2023', 'impossible date'],
    ['03/14/2021', 'impossible date'],
    ['2021-13-01', 'impossible date'],
    ['13/2021', 'impossible date'],
    ['32 May 2020', 'impossible date'],
    [0, 'impossible date'],
    [{ serial: 0, epoch: 1900 }, 'impossible date'],
    [{ serial: -4, epoch: 1900 }, 'impossible date'],
    [4, 'impossible date'],
    ['12/11', 'impossible date'],
    ['12/11/2031', 'date in the future'],
    ['02/12/2026', 'date in the future'],
    ['2027', 'date in the future'],
    ['01/01/1900', 'implausibly old date'],
    ['01/01/1970', 'implausibly old date'],
    ['1850', 'implausibly old date'],
    [{ serial: 1, epoch: 1900 }, 'implausibly old date'],
    [{ serial: 2021, epoch: 1900 }, 'implausibly old date'],
    ['see folder', 'not a date'],
    [{ error: '#VALUE!' }, 'formula error'],
  ])('%j is refused: %s', (cell, why) => {
    expect(readingOf(readLastInspection(cell, today))).toBe(`! ${why}`)
  })

  it('takes today, and a month or a year that may already have begun', () => {
    expect(readingOf(readLastInspection('01/12/2026', today))).toMatchObject({ date: { day: '2026-12-01' } })
    expect(readingOf(readLastInspection('Dec 2026', today))).toMatchObject({ date: { day: '2026-12-01' } })
    expect(readingOf(readLastInspection('2026', today))).toMatchObject({ date: { day: '2026-01-01' } })
  })
})

describe('the next due date', () => {
  it.each<[Cell, boolean, unknown]>([
    ['11/06/2027', true, '2027-06-11'],
    ['June 2027', true, '2027-06-01'],
    [{ serial: 46704, epoch: 1900 }, true, '2027-11-13'],
    ['', true, null],
    ['n/a', true, null],
    ['31/02/2027', true, '! impossible date'],
    ['01/01/2099', true, '! date too far ahead'],
    [{ serial: 1827, epoch: 1900 }, false, null],
    [{ serial: 1827, epoch: 1900 }, true, '! implausibly old date'],
  ])('%j, inspected %j, is %j', (cell, inspected, expected) => {
    expect(readingOf(readNextDue(cell, today, inspected))).toEqual(expected)
  })
})

describe('a date serial', () => {
  // ECMA-376 Part 1, 18.17.4.1: 1900-03-01 is serial 61 of the 1900 system; 1904-01-02 is serial 1 of the 1904 system.
  it.each([
    [61, 1900, '1900-03-01'],
    [1, 1904, '1904-01-02'],
    [0.5, 1900, null],
    [3_000_000, 1900, null],
    [Number.NaN, 1900, null],
  ] as const)('%d of %d is %s', (serial, epoch, day) => {
    expect(serialDay(serial, epoch)).toBe(day)
  })
})
