import { type PartialDate } from '@/lib/calendar/partial-date'
import { type Cell } from './cell'
import { cellText, isDateSerial, isErrorCell } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { parseDate } from './parse-date'
import { serialDay } from './serial-day'

/** No wiring was inspected, and no report asked for, before this year [our judgement; placeholders fall below it]. */
const FIRST_YEAR = 1950
/** A bare number in this range is a year, one above it a date serial that lost its format. */
const LAST_YEAR = 2200
const FIRST_SERIAL = 18_264

export type DateWords =
  PartialDate | 'never' | 'unknown' | { readonly unclear: string } | { readonly why: string }

const NEVER =
  /^(?:never(?: (?:inspected|tested|done|had one))?|no|none|nil|none (?:on (?:file|record|system)|held|found|available|recorded)|no (?:eicr|eic|pir|cert|certificate|report|record|test|inspection|date)s?(?: (?:on (?:file|record|system)|held|found|available))?|not (?:yet )?(?:done|inspected|tested|had)|(?:nothing|not) on (?:file|record))$/
const UNCLEAR =
  /^(?:no access|refused|booked|pending|awaiting|awaited|due|overdue|expired|in progress|wip|ordered|void|requested|outstanding|required|needed|lost|missing|yes|y|on file|done|complete|completed)\b/

/** The day that a computer's clock starts with stands where nobody typed a date. */
const isPlaceholder = ({ day, precision }: PartialDate) => precision === 'day' && day === '1970-01-01'

const fits = (date: PartialDate): DateWords =>
  Number(date.day.slice(0, 4)) < FIRST_YEAR || isPlaceholder(date) ? { why: 'implausibly old date' } : date

/**
 * The date that a cell holds, or what it says instead of one.
 * @param thisYear settles the century of a two-digit year
 * @returns `why` where it looks like a date and cannot be one; `unclear` for words such as "booked" or "no access"
 * @example dateOfCell('none on file', 2026) // 'never'
 * @example dateOfCell({ serial: 44878, epoch: 1900 }, 2026) // { day: '2022-11-13', precision: 'day' }
 */
export function dateOfCell(cell: Cell, thisYear: number): DateWords {
  if (isErrorCell(cell)) return { why: 'formula error' }
  if (isDateSerial(cell)) {
    const day = serialDay(cell.serial, cell.epoch)
    return day === null ? { why: 'impossible date' } : fits({ day, precision: 'day' })
  }
  if (typeof cell === 'number') {
    if (Number.isInteger(cell) && cell >= 1000 && cell <= LAST_YEAR) return dateOfCell(String(cell), thisYear)
    const day = cell >= FIRST_SERIAL ? serialDay(cell, 1900) : null
    return day === null ? { why: 'impossible date' } : fits({ day, precision: 'day' })
  }
  const text = cellText(cell).replaceAll('\\', '/')
  if (saysUnknown(text)) return 'unknown'
  const words = foldWords(text)
  if (NEVER.test(words)) return 'never'
  const date = parseDate(text.replace(/^(?:c\.?|circa|approx\.?|about)\s*(?=\S)/i, ''), thisYear)
  if (date === 'impossible') return { why: 'impossible date' }
  if (date !== 'other') return fits(date)
  if (/^\d{5}(?:\.\d+)?$/.test(text)) return dateOfCell(Number(text), thisYear)
  if (UNCLEAR.test(words)) return { unclear: text }
  return { why: /^[\d\s/.-]+$/.test(text) ? 'impossible date' : 'not a date' }
}
