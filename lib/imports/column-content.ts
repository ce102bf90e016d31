/** How far the cells of a column fit a field: what a heading promises, the content must keep. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { waysOf } from '@/lib/electrical/consumer-unit'
import { type Cell } from './cell'
import { cellText, isBlank, isDateSerial } from './cell-text'
import { dateOfCell } from './date-of-cell'
import { saysUnknown } from './fold-words'
import { gridReference } from './grid-reference'
import { type ImportField } from './home-draft'
import { readAssessment } from './read-assessment'
import { readBedrooms } from './read-bedrooms'
import { readBoardType } from './read-board-type'
import { readCount } from './read-count'
import { readDwellingType, saysCommunal } from './read-dwelling-type'
import { readNation } from './read-nation'
import { readPostcode } from './read-postcode'
import { readRcdCover } from './read-rcd-cover'
import { readTenure } from './read-tenure'
import { readWiring } from './read-wiring'
import { readYearBuilt } from './read-year-built'
import { type Reading } from './reading'

type Fit = (cell: Cell, thisYear: number) => boolean

const understood = (reading: Reading<unknown>) =>
  reading.ok && !(reading.note ?? '').includes('not understood')
const numberOf = (cell: Cell) => (/^[+-]?\d+(?:\.\d+)?$/.test(cellText(cell)) ? Number(cellText(cell)) : NaN)
const between =
  (low: number, high: number): Fit =>
  (cell) =>
    numberOf(cell) >= low && numberOf(cell) <= high
const isDate: Fit = (cell, thisYear) => {
  // A bare number is a date only where it is a recent day's serial, or a year.
  if (typeof cell === 'number' && !(cell >= 1950 && cell <= 2100)) return cell > 30_000 && cell < 60_000
  const date = dateOfCell(cell, thisYear)
  return typeof date === 'object' && 'day' in date
}
/** "Never", "booked" and "yes" stand in columns of dates, and in columns of other things: they tell nothing. */
const isDateWord: Fit = (cell, thisYear) => {
  const date = typeof cell === 'string' ? dateOfCell(cell, thisYear) : null
  return typeof date === 'string' || (date !== null && 'unclear' in date)
}
const DATE_FIELDS: readonly ImportField[] = ['last-inspection', 'next-due']
const isYear: Fit = (cell, thisYear) => understood(readYearBuilt(cell, thisYear))
const isText: Fit = (cell) =>
  typeof cell === 'string' && Number.isNaN(numberOf(cell)) && !/^\d/.test(cellText(cell))
const looksLikeAddress: Fit = (cell) =>
  /\d+[a-z]?,? +(?:\p{L}|['’])+/iu.test(cellText(cell)) ||
  /\b(?:flat|house|cottage|court|street|road|lane)\b/i.test(cellText(cell))

const FITS: Partial<Record<ImportField, Fit>> = {
  reference: (cell) => !isDateSerial(cell) && cellText(cell).length <= 40,
  uprn: (cell) => /^\d{4,14}$|^\d\.\d+e\+\d+$/i.test(cellText(cell)),
  kind: (cell) => saysCommunal(cell) || /^(?:dwelling|home|communal|block|flat|house)/i.test(cellText(cell)),
  number: (cell) =>
    isDateSerial(cell) ||
    /^(?:(?:flat|apt|apartment|unit|no\.?|plot)\s*)?\d{1,4}\s?[a-z]?\b/i.test(cellText(cell)),
  street: isText,
  address: looksLikeAddress,
  town: (cell) => isText(cell, 0) && cellText(cell).length <= 40,
  postcode: (cell) =>
    understood(readPostcode(cell)) || /^[a-z]{1,3}\d?[a-z\d]?\s?\d[a-z]{2}$/i.test(cellText(cell)),
  patch: (cell) => !isDateSerial(cell) && cellText(cell).length <= 60,
  nation: (cell) => understood(readNation(cell)),
  tenure: (cell) => understood(readTenure(cell)),
  built: isYear,
  'dwelling-type': (cell) =>
    understood(readDwellingType(cell)) || /\bhouse\b|\bterrace/i.test(cellText(cell)),
  bedrooms: (cell) => understood(readBedrooms(cell)) || /^(?:one|two|three|four|five)$/i.test(cellText(cell)),
  'board-type': (cell) => understood(readBoardType(cell)),
  'rcd-cover': (cell) => understood(readRcdCover(cell)),
  ways: (cell) => waysOf(cellText(cell).toUpperCase()) !== null,
  wiring: (cell) => understood(readWiring(cell)),
  rewired: (cell, thisYear) =>
    isYear(cell, thisYear) ||
    isDate(cell, thisYear) ||
    /^(?:y|n|yes|no|full|part|partial)$/i.test(cellText(cell)),
  'last-inspection': isDate,
  'next-due': isDate,
  assessment: (cell) => understood(readAssessment(cell)),
  'open-c1': (cell) => understood(readCount(cell)),
  'open-c2': (cell) => understood(readCount(cell)),
  'open-c3': (cell) => understood(readCount(cell)),
  'open-fi': (cell) => understood(readCount(cell)),
  easting: between(1000, 1_300_000),
  northing: between(1000, 1_300_000),
  'grid-reference': (cell) =>
    gridReference(cellText(cell)) !== null || /^\d{5,7}[\s,]+\d{5,7}$/.test(cellText(cell)),
  latitude: between(48, 62),
  longitude: between(-10, 3),
}

/**
 * The share [0 to 1] of a column's telling cells that fit a field; null where no cell tells anything.
 * @example contentFit('postcode', ['ZX1 1AA', 'ZX1 2AB', null], 2026) // 1
 */
export function contentFit(field: ImportField, cells: readonly Cell[], thisYear: number): number | null {
  const fits = FITS[field]
  const words = DATE_FIELDS.includes(field) ? isDateWord : () => false
  const telling = cells.filter(
    (cell) => !isBlank(cell) && !saysUnknown(cellText(cell)) && !words(cell, thisYear),
  )
  if (telling.length === 0) return null
  return fits ? telling.filter((cell) => fits(cell, thisYear)).length / telling.length : 1
}

/** The share [0 to 1] of a column's dates that lie after a day; null where it holds none. */
export function futureShare(cells: readonly Cell[], today: CalendarDay): number | null {
  const days = cells.flatMap((cell) => {
    const date = isBlank(cell) ? 'unknown' : dateOfCell(cell, Number(today.slice(0, 4)))
    return typeof date === 'object' && 'day' in date ? [date.day] : []
  })
  return days.length === 0 ? null : days.filter((day) => day > today).length / days.length
}

/** The share [0 to 1] of a column's filled cells that differ from each other. */
export function distinctShare(cells: readonly Cell[]): number {
  const texts = cells.map(cellText).filter(Boolean)
  return texts.length === 0 ? 0 : new Set(texts).size / texts.length
}
