import { describe, expect, it } from 'vitest'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { type Cell } from '@/lib/imports/cell'
import { createRowReader } from '@/lib/imports/create-row-reader'

const headings = ['Ref', 'UPRN', 'Address', 'Postcode', 'Fuse box', 'C2', 'Last EICR']
const mapping = {
  reference: 0,
  uprn: 1,
  address: 2,
  postcode: 3,
  'board-type': 4,
  'open-c2': 5,
  'last-inspection': 6,
}

/** What became of each row: its kind, and why. */
function outcomes(...rows: (readonly Cell[])[]): string[] {
  const reader = createRowReader({ mapping, headings, today: calendarDay('2026-12-01'), nation: 'england' })
  return rows.map((cells, at) => {
    const outcome = reader.read({ number: at + 1, cells })
    if (outcome.kind === 'rejected') return `rejected: ${outcome.problems.map((one) => one.why).join('; ')}`
    return outcome.kind === 'total' ? `total: ${outcome.why}` : outcome.kind
  })
}

const one = ['A-1', '100099000005', '4 Lantern Lane', 'ZX2 3QT', 'MCB'] as const

describe('the same home twice in one file', () => {
  it('is found by reference, UPRN and address together', () => {
    expect(outcomes(one, one)).toEqual(['accepted', 'rejected: same home as row 1'])
  })

  it('is found by its address alone, however it is typed', () => {
    expect(
      outcomes([null, null, '4 Lantern Lane', 'ZX2 3QT'], [null, null, '4, LANTERN LN.', 'zx23qt']),
    ).toEqual(['accepted', 'rejected: same home as row 1'])
    expect(outcomes(one, [null, null, '4 Lantern Lane', 'ZX2 3QT'])[1]).toBe('rejected: same home as row 1')
  })

  it('is told from another home with its UPRN or its reference', () => {
    expect(outcomes(one, ['A-2', '100099000005', '999 Fore Street', 'ZX2 3QT'])[1]).toBe(
      'rejected: UPRN already used in row 1',
    )
    expect(outcomes(one, ['a-1', '100099000006', '999 Fore Street', 'ZX2 3QT'])[1]).toBe(
      'rejected: reference already used in row 1',
    )
    expect(outcomes(one, ['A-1', '100099000005', '999 Fore Street', 'ZX2 3QT'])[1]).toBe(
      'rejected: UPRN already used in row 1',
    )
  })

  it('is told from two homes that share an address', () => {
    expect(outcomes(one, ['A-2', '100099000006', '4 Lantern Lane', 'ZX2 3QT'])[1]).toBe(
      'rejected: address already used in row 1',
    )
  })

  it('counts a UPRN with padding as the same', () => {
    expect(outcomes(['A', '000012345678', '1 Ropewalk', ''], ['B', 12345678, '2 Ropewalk', ''])[1]).toBe(
      'rejected: UPRN already used in row 1',
    )
  })

  it('a rejected row reserves nothing, so the good row of that home is taken', () => {
    expect(outcomes([...one, 'two'], one)).toEqual(['rejected: not a number', 'accepted'])
  })

  it('the same address under another postcode is another home', () => {
    expect(
      outcomes([null, null, '1 Fore Street', 'ZX1 1AA'], [null, null, '1 Fore Street', 'ZX2 3QT']),
    ).toEqual(['accepted', 'accepted'])
  })
})

describe('rows that are no homes', () => {
  it.each<[string, readonly Cell[]]>([
    ['blank', [null, '', '  ', null]],
    ['total: a total', ['TOTAL', 640, null, null, null, 3]],
    ['total: a total', ['Grand Total', null, null, null, null, 3]],
    ['total: a total', [null, null, 'Total homes: 640']],
    ['total: a total', ['Sum', '', '', '', '', 12]],
    ['total: a total', [null, null, null, null, null, 3]],
    ['total: the headings once more', headings],
    ['total: the headings once more', ['REF', 'uprn', 'ADDRESS', 'POSTCODE', 'Fuse box']],
    ['total: a remark', ['NORTH QUAY']],
    ['total: a remark', [null, null, 'End of list']],
    ['total: a remark', ['Exported 24/11/2026 by the asset team']],
  ])('%s', (kind, cells) => {
    expect(outcomes(cells)).toEqual([kind])
  })

  it.each<[readonly Cell[]]>([
    [['A-1', null, '1 Total Street', 'ZX2 3QT']],
    [[null, null, '4 Lantern Lane']],
    [['TOTAL', null, '4 Lantern Lane', 'ZX2 3QT']],
  ])('%j is a home', (cells) => {
    expect(outcomes(cells)).toEqual(['accepted'])
  })

  it('a home without an address is told, not passed over', () => {
    expect(outcomes([null, '100099000005', null, null, null, 0])).toEqual(['rejected: no address'])
  })
})
