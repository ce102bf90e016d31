import { describe, expect, it } from 'vitest'
import { openSheets } from '@/lib/gateways/sheets/open-sheets'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { type Nation } from '@/lib/homes/nation'
import { type Cell } from '@/lib/imports/cell'
import { createRowReader } from '@/lib/imports/create-row-reader'
import { guessMapping } from '@/lib/imports/guess-mapping'
import { type RowOutcome } from '@/lib/imports/row-outcome'
import { tallyOutcomes } from '@/lib/imports/tally-outcomes'

const headings = ['Address', 'Nation', 'Tenure', 'Last EICR', 'Next due', 'Fuse box', 'C1', 'Patch']

function tally(today: string, nation: Nation, ...rows: (readonly Cell[])[]) {
  const mapping = {
    address: 0,
    nation: 1,
    tenure: 2,
    'last-inspection': 3,
    'next-due': 4,
    'board-type': 5,
    'open-c1': 6,
    patch: 7,
  }
  const reader = createRowReader({ mapping, headings, today: calendarDay(today), nation })
  const outcomes = rows.map((cells, at) => reader.read({ number: at + 2, cells }))
  return tallyOutcomes(outcomes, { sheet: 'Stock', headerRow: 1, today: calendarDay(today), nation })
}

describe('the standing of the rows, by the law alone', () => {
  // SI 2020/312 reg 3(2): at intervals of no more than five years. WSI 2022/6 reg 6: within five years beginning that day.
  it.each<[string, Nation, string]>([
    ['2026-12-14', 'england', 'in date'],
    ['2026-12-15', 'england', 'lapsed'],
    ['2026-12-13', 'wales', 'in date'],
    ['2026-12-14', 'wales', 'lapsed'],
    ['2026-12-14', 'scotland', 'in date'],
    ['2026-12-14', 'northern-ireland', 'in date'],
  ])('on %s in %s an inspection of 14 December 2021 is %s', (today, nation, standing) => {
    expect(tally(today, nation, ['1 Ropewalk', '', '', '14/12/2021']).standing).toEqual({ [standing]: 1 })
  })

  it('a row’s own nation counts before the organisation’s', () => {
    expect(tally('2026-12-14', 'england', ['1 Ropewalk', 'Wales', '', '14/12/2021']).standing).toEqual({
      lapsed: 1,
    })
  })

  it('the report’s own date counts where it is sooner, and a partly known date from its first day', () => {
    expect(
      tally('2026-12-01', 'england', ['1 Ropewalk', '', '', '14/12/2023', '14/12/2025']).standing,
    ).toEqual({ lapsed: 1 })
    expect(
      tally('2026-12-01', 'england', ['1 Ropewalk', '', '', '14/12/2023', '14/12/2033']).standing,
    ).toEqual({ 'in date': 1 })
    expect(tally('2026-12-01', 'england', ['1 Ropewalk', '', '', '2021']).standing).toEqual({ lapsed: 1 })
    expect(tally('2026-12-01', 'england', ['1 Ropewalk', '', '', 'Dec 2021']).standing).toEqual({
      'in date': 1,
    })
  })

  it('never inspected and not known are told apart', () => {
    const { standing } = tally(
      '2026-12-01',
      'england',
      ['1 Ropewalk', '', '', 'Never'],
      ['2 Ropewalk', '', '', '?'],
      ['3 Ropewalk'],
    )
    expect(standing).toEqual({ 'never inspected': 1, 'unknown date': 2 })
  })
})

describe('the counts', () => {
  const result = tally(
    '2026-12-01',
    'england',
    ['1 Ropewalk', '', 'Leasehold', 'Aug 2021', '', 'BS3036', 1, 'North Quay'],
    ['2 Ropewalk', '', 'Social rent', '31/02/2020', '', 'MCB', 'two', 'North Quay'],
    [],
    ['3 Ropewalk', '', '', '', '', 'Mixed MCB / rewireable', 2, ''],
    ['4 Ropewalk', '', '', '', '', 'metal-clad', '', ''],
    ['TOTAL', '', '', '', '', '', 3],
  )

  it('add up', () => {
    expect(result).toMatchObject({
      data_rows: 4,
      accepted: 3,
      blank_rows: 1,
      open_c1: 3,
      out_of_scope_tenure: 1,
      header_row: 1,
      sheet: 'Stock',
    })
    expect(result.board).toEqual({ rewireable: 1, mixed: 1, unknown: 1 })
    expect(result.rewireable_by_patch).toEqual({ 'North Quay': 1, 'no patch': 1 })
  })

  it('give one entry for each rejected row, and the date notes apart from the rest', () => {
    expect(result.rejected).toEqual([{ row: 3, why: 'impossible date; not a number' }])
    expect(result.warned).toEqual([{ row: 2, why: 'date known to the month' }])
    expect(result.noted).toEqual([{ row: 6, why: 'consumer unit not understood', field: 'board-type' }])
    expect(result.set_aside).toEqual([{ row: 7, why: 'a total' }])
  })
})

it('a landlord with three homes and five columns', async () => {
  const file = await openSheets('tests/fixtures/three-homes.csv')
  const [head, ...rows] = await file.preview(0, 10)
  const today = calendarDay('2026-12-01')
  const mapping = guessMapping(head?.cells ?? [], rows, today)
  expect(mapping).toEqual({ address: 0, postcode: 1, built: 2, 'board-type': 3, 'last-inspection': 4 })
  const reader = createRowReader({ mapping, headings: head?.cells ?? [], today, nation: 'england' })
  const outcomes: RowOutcome[] = rows.map((row) => reader.read(row))
  expect(outcomes.map((one) => (one.kind === 'accepted' ? one.draft : one))).toMatchObject([
    { address: '4 Lantern Lane', town: 'Quillhaven', postcode: 'ZX2 3QT', built: { from: 1958, to: 1958 }, boardType: 'rewireable', rcdCover: 'unknown' },
    { address: 'Flat 2, Herring Court', town: null, boardType: 'breakers', rcdCover: 'part', inspectionRecord: 'unknown' },
    { postcode: 'ZX1 5BB', built: { from: 1885, to: 1895, about: true }, boardType: 'unknown', lastInspection: { day: '2023-06-01', precision: 'month' } },
  ]) // prettier-ignore
  expect(tallyOutcomes(outcomes, { sheet: '', headerRow: 1, today, nation: 'england' })).toMatchObject({
    accepted: 3,
    rejected: [],
    standing: { lapsed: 1, 'unknown date': 1, 'in date': 1 },
  })
})
