// Eras: reigns and wars by their years; slang: common practice, no source.
import { describe, expect, it } from 'vitest'
import { type Cell } from '@/lib/imports/cell'
import { readRewired } from '@/lib/imports/read-rewired'
import { readYearBuilt } from '@/lib/imports/read-year-built'
import { readingOf } from './reading-of'

describe('the year built', () => {
  it.each<[Cell, number | null, number | null, boolean]>([
    [1931, 1931, 1931, false],
    ['1931', 1931, 1931, false],
    ['1931.0', 1931, 1931, false],
    ['c.1900', 1895, 1905, true],
    ['c1900', 1895, 1905, true],
    ['circa 1900', 1895, 1905, true],
    ['1958?', 1953, 1963, true],
    ['1960s', 1960, 1969, false],
    ["1960's", 1960, 1969, false],
    ['60s', 1960, 1969, false],
    ['circa 1950s', 1950, 1959, true],
    ['early 1970s', 1970, 1974, false],
    ['late 1970s', 1975, 1979, false],
    ['1945-64', 1945, 1964, false],
    ['1930 - 1949', 1930, 1949, false],
    ['1919 to 1944', 1919, 1944, false],
    ['England: 1930-1949', 1930, 1949, false],
    ['D: 1950-1966', 1950, 1966, false],
    ['pre war', null, 1939, false],
    ['Pre-War', null, 1939, false],
    ['pre-1919', null, 1918, false],
    ['<1919', null, 1918, false],
    ['before 1900', null, 1899, false],
    ['post 1990', 1991, null, false],
    ['2012 onwards', 2012, null, false],
    ['1967+', 1967, null, false],
    ['post-war', 1945, null, false],
    ['inter-war', 1919, 1939, false],
    ['Edwardian', 1901, 1914, false],
    ['Victorian terrace', 1837, 1901, false],
    ['late Victorian', 1870, 1901, false],
    ['19th century', 1801, 1900, false],
    ['12/06/1987', 1987, 1987, false],
    [{ serial: 32000, epoch: 1900 }, 1987, 1987, false],
    ['2020s', 2020, 2026, false],
    ['?', null, null, false],
    ['', null, null, false],
    ['new build', null, null, false],
  ])('%j is from %j to %j, about: %j', (cell, from, to, about) => {
    expect(readingOf(readYearBuilt(cell, 2026))).toEqual({ from, to, about })
  })

  it.each<[Cell, string]>([
    [2031, 'year in the future'],
    [19555, 'not a year'],
    [85, 'not a year'],
    ['0', 'not a year'],
    ['31/02/1950', 'not a year'],
    [{ serial: 1931, epoch: 1900 }, 'not a year'],
    [{ error: '#N/A' }, 'formula error'],
  ])('%j is refused: %s', (cell, why) => {
    expect(readingOf(readYearBuilt(cell, 2026))).toBe(`! ${why}`)
  })

  it('notes words that name no year', () => {
    expect(readYearBuilt('new build', 2026)).toMatchObject({ note: 'year built not understood' })
  })
})

describe('the year rewired', () => {
  it.each<[Cell, number | null, string | null]>([
    [2015, 2015, null],
    ['2015', 2015, null],
    ['full rewire 2015', 2015, null],
    ['Rewired in 2015', 2015, null],
    ['12/06/2015', 2015, null],
    ['c.2004', 2004, 'rewired about then'],
    ['1990s', null, 'rewired, year not exact'],
    ['Y', null, 'rewired, year not given'],
    ['partial 2015', null, 'rewired in part, not counted'],
    ['No', null, null],
    ['original', null, null],
    ['', null, null],
  ])('%j is %j, note %j', (cell, year, note) => {
    expect(readRewired(cell, 2026)).toEqual({ ok: true, value: year, note })
  })

  it('refuses a year to come and one before electric light', () => {
    expect(readingOf(readRewired(2030, 2026))).toBe('! year in the future')
    expect(readingOf(readRewired(1700, 2026))).toBe('! not a year')
  })
})
