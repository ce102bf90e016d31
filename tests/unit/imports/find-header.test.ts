import { describe, expect, it } from 'vitest'
import { findHeader, LEAST_HEADER_SCORE } from '@/lib/imports/find-header'
import { pickSheet } from '@/lib/imports/pick-sheet'
import { type Cell } from '@/lib/imports/cell'

const rows = (...cells: (readonly Cell[])[]) => cells.map((row, at) => ({ number: at + 1, cells: row }))

describe('the row of headings', () => {
  it('lies below titles and blank rows', () => {
    const list = rows(
      ['QUILLHAVEN HOMES'],
      ['Stock list, exported 24/11/2026'],
      [],
      ['Prop Ref', 'Address', 'P’code', 'Fuse board'],
      ['1', '4 Lantern Lane', 'ZX2 3QT', 'MCB'],
    )
    expect(findHeader(list)).toMatchObject({ headerRow: 4 })
  })

  it('lies below a row of group names', () => {
    const list = rows(
      ['Property', null, null, 'Electrical', null],
      ['Ref', 'Address', 'Postcode', 'EICR date', 'Next due'],
      ['1', '4 Lantern Lane', 'ZX2 3QT', '01/02/2023', ''],
    )
    expect(findHeader(list)).toMatchObject({ headerRow: 2 })
  })

  it('may be the first row, in any letters', () => {
    expect(findHeader(rows(['ADDRESS', 'post code', 'YEAR BUILT'], ['1', '2', '3']))).toMatchObject({
      headerRow: 1,
    })
  })

  it('scores too low where there are no headings', () => {
    const { score } = findHeader(
      rows(['4 Lantern Lane', 'ZX2 3QT', 1958], ['9 Fore Street', 'ZX1 5BB', 1890]),
    )
    expect(score).toBeLessThan(LEAST_HEADER_SCORE)
    expect(findHeader([])).toEqual({ headerRow: 1, score: 0 })
  })
})

it('the sheet that looks most like a stock list is picked', () => {
  const cover = {
    name: 'READ ME',
    index: 0,
    rows: rows(['Stock list'], ['Address and postcode are in the next tab']),
  }
  const template = { name: 'Blank', index: 1, rows: rows(['Address', 'Postcode', 'Built', 'Tenure']) }
  const list = {
    name: 'Stock',
    index: 2,
    rows: rows(['Address', 'Postcode', 'Fuse box'], ['4 Lantern Lane', 'ZX2 3QT', 'MCB']),
  }
  expect(pickSheet([cover, template, list])).toMatchObject({ name: 'Stock', index: 2, headerRow: 1 })
  expect(pickSheet([])).toBeNull()
})
