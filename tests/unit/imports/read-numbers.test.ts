// UPRN: BS 7666-2. Postcode shape: BS 7666-0. The rest: common practice, no source.
import { describe, expect, it } from 'vitest'
import { type Cell } from '@/lib/imports/cell'
import { readBedrooms } from '@/lib/imports/read-bedrooms'
import { readCount } from '@/lib/imports/read-count'
import { readName } from '@/lib/imports/read-name'
import { postcodeAtEnd, readPostcode } from '@/lib/imports/read-postcode'
import { readUprn } from '@/lib/imports/read-uprn'
import { readingOf } from './reading-of'

describe('a UPRN', () => {
  it.each<[Cell, string | null]>([
    [100099000005, '100099000005'],
    ['100099000005', '100099000005'],
    ['100 099 000 005', '100099000005'],
    ['000012345678', '12345678'],
    [12345678, '12345678'],
    ['12345678.0', '12345678'],
    ['', null],
    ['n/k', null],
    [0, null],
    ['1.00099E+11', '! UPRN lost its digits'],
    ['1.00099e11', '! UPRN lost its digits'],
    [100099000000, '! UPRN lost its digits'],
    ['100099000000', '! UPRN lost its digits'],
    ['1000990000051', '! not a UPRN'],
    ['10009900000A', '! not a UPRN'],
    [100099000005.5, '! not a UPRN'],
    [-5, '! not a UPRN'],
    [{ error: '#N/A' }, '! formula error'],
  ])('%j is %j', (cell, uprn) => {
    expect(readingOf(readUprn(cell))).toBe(uprn)
  })
})

describe('a postcode', () => {
  it.each<[Cell, string | null]>([
    ['zx15bb', 'ZX1 5BB'],
    ['ZX1 5BB', 'ZX1 5BB'],
    [' zx1  5bb ', 'ZX1 5BB'],
    ['ZX12 5BB', 'ZX12 5BB'],
    ['W1A 1AA', 'W1A 1AA'],
    ['EC1A 1BB', 'EC1A 1BB'],
    ['M1 1AE', 'M1 1AE'],
    ['', null],
    ['n/k', null],
    ['ZXI 1AA', '! postcode'],
    ['ZX1 OAA', '! postcode'],
    ['ZX1 1CA', '! postcode'],
    ['QX1 1AA', '! postcode'],
    ['ZX1', '! postcode'],
    ['ZX123 1AA', '! postcode'],
    [12345, '! postcode'],
  ])('%j is %j', (cell, postcode) => {
    expect(readingOf(readPostcode(cell))).toBe(postcode)
  })

  it('is found at the end of an address', () => {
    expect(postcodeAtEnd('9 Fore Street, Quillhaven, zx1 5bb')).toEqual({
      rest: '9 Fore Street, Quillhaven',
      postcode: 'ZX1 5BB',
    })
    expect(postcodeAtEnd('9 Fore Street')).toEqual({ rest: '9 Fore Street', postcode: null })
  })
})

describe('a count of observations', () => {
  it.each<[Cell, number | null | string]>([
    [2, 2], ['3', 3], ['2.0', 2], [0, 0], ['-', 0], ['nil', 0], ['none', 0], ['', null], ['n/k', null], ['?', null],
    ['two', '! not a number'], [1.5, '! not a number'], [-1, '! not a number'], ['2 (kitchen)', '! not a number'],
    [44878, '! not a number'], [{ serial: 44878, epoch: 1900 }, '! not a number'],
  ])('%j is %j', (cell, count) => {
    expect(readingOf(readCount(cell))).toBe(count)
  }) // prettier-ignore
})

describe('bedrooms', () => {
  it.each<[Cell, number | null | string]>([
    [3, 3], ['3', 3], ['3 bed', 3], ['2B4P', 2], ['4 bedrooms', 4], ['studio', 0], ['Bedsit', 0], [0, 0], ['', null], ['?', null],
    ['two', '! not a number'], [99, '! not a number'], [2.5, '! not a number'],
  ])('%j is %j', (cell, count) => {
    expect(readingOf(readBedrooms(cell))).toBe(count)
  }) // prettier-ignore
})

it('a reference that a spreadsheet turned into a date cannot be taken', () => {
  expect(readingOf(readName({ serial: 46000, epoch: 1900 }, 'reference', 60))).toBe(
    '! reference turned into a date',
  )
  expect(readingOf(readName('QH-1', 'reference', 3))).toBe('! reference too long')
  expect(readingOf(readName('QH-1', 'reference', 60))).toBe('QH-1')
})
