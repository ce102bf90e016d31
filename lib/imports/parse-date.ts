/** A date as people in the United Kingdom type it: day before month, whole or partly known. */
import { dayOf, isRealDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { monthOfWord } from './month-of-word'

/** `impossible` looks like a date and is none; `other` does not look like a date. */
export type ParsedDate = PartialDate | 'impossible' | 'other'

/** A two-digit year is of this century up to this many years after today's, and of the last one beyond. */
const YEARS_AHEAD = 20

function fullYear(digits: string, thisYear: number): number {
  const year = Number(digits)
  if (digits.length !== 2) return year
  const century = Math.floor(thisYear / 100) * 100
  return year <= (thisYear % 100) + YEARS_AHEAD ? century + year : century - 100 + year
}

const wholeDay = (year: number, month: number, day: number): ParsedDate =>
  isRealDay(year, month, day) ? { day: dayOf(year, month, day), precision: 'day' } : 'impossible'

const wholeMonth = (year: number, month: number): ParsedDate =>
  isRealDay(year, month, 1) ? { day: dayOf(year, month, 1), precision: 'month' } : 'impossible'

const wholeYear = (year: number, firstMonth = 1): ParsedDate =>
  isRealDay(year, firstMonth, 1) ? { day: dayOf(year, firstMonth, 1), precision: 'year' } : 'impossible'

type Form = readonly [RegExp, (parts: readonly string[], thisYear: number) => ParsedDate]

const SEPARATOR = String.raw`\s*[/.\-\s]\s*`
const CLOCK = String.raw`(?:[T ,]+\d{1,2}[:.]\d{2}(?:[:.]\d{2}(?:\.\d+)?)?\s*(?:am|pm|Z|[+-]\d{2}:?\d{2})?)?`
const WEEKDAY = String.raw`(?:(?:mon|tue|wed|thu|fri|sat|sun)[a-z]*\.?,?\s+)?`
const MONTH = String.raw`([a-z]{3,9}\.?)`
const YEAR = String.raw`(\d{4}|'?\d{2})`
const form = (pattern: string, read: Form[1]): Form => [new RegExp(`^${pattern}$`, 'i'), read]
const bare = (year: string) => year.replace("'", '')

function named(word: string, read: (month: number) => ParsedDate): ParsedDate {
  const month = monthOfWord(word)
  return month === null ? 'other' : read(month)
}

const FORMS: readonly Form[] = [
  form(String.raw`(\d{4})(?:\.0+)?`, ([y]) => wholeYear(Number(y))),
  form(String.raw`(?:spring|summer|autumn|early|mid|late|start of|end of)[\s\-]+(\d{4})`, ([y]) =>
    wholeYear(Number(y)),
  ),
  form(String.raw`(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})${CLOCK}`, ([y, m, d]) =>
    wholeDay(Number(y), Number(m), Number(d)),
  ),
  form(String.raw`(\d{4})(\d{2})(\d{2})`, ([y, m, d]) => wholeDay(Number(y), Number(m), Number(d))),
  form(
    String.raw`${WEEKDAY}(\d{1,2})${SEPARATOR}(\d{1,2})${SEPARATOR}${YEAR}${CLOCK}`,
    ([d, m, y = ''], now) => wholeDay(fullYear(bare(y), now), Number(m), Number(d)),
  ),
  form(
    String.raw`${WEEKDAY}(\d{1,2})(?:st|nd|rd|th)?(?:\s+of)?[\s\-/.,]*${MONTH}[\s\-/.,]*${YEAR}${CLOCK}`,
    ([d, word = '', y = ''], now) =>
      named(word, (month) => wholeDay(fullYear(bare(y), now), month, Number(d))),
  ),
  form(String.raw`${MONTH}\s+(\d{1,2})(?:st|nd|rd|th)?,?\s+(\d{4})${CLOCK}`, ([word = '', d, y]) =>
    named(word, (month) => wholeDay(Number(y), month, Number(d))),
  ),
  form(String.raw`${MONTH}[\s\-/.,]*${YEAR}`, ([word = '', y = ''], now) =>
    named(word, (month) => wholeMonth(fullYear(bare(y), now), month)),
  ),
  form(String.raw`(\d{4})[\s\-/.,]*${MONTH}`, ([y, word = '']) =>
    named(word, (month) => wholeMonth(Number(y), month)),
  ),
  form(String.raw`(\d{1,2})\s*[/.\-]\s*(\d{4})`, ([m, y]) => wholeMonth(Number(y), Number(m))),
  form(String.raw`(\d{4})\s*[/.\-]\s*(\d{1,2})`, ([y, m]) =>
    Number(m) > 12 ? 'other' : wholeMonth(Number(y), Number(m)),
  ),
  form(String.raw`q(?:tr|uarter)?\s*([1-4])[\s\-/,]*(\d{4})`, ([q, y]) =>
    wholeYear(Number(y), Number(q) * 3 - 2),
  ),
  form(String.raw`(\d{4})[\s\-/,]*q(?:tr|uarter)?\s*([1-4])`, ([y, q]) =>
    wholeYear(Number(y), Number(q) * 3 - 2),
  ),
]

/**
 * The date that a text holds. A quarter counts as known to the year, from its own first day on: `day` is the first
 * day that it could be.
 * @param thisYear settles the century of a two-digit year
 * @example parseDate('1st June 2020', 2026) // { day: '2020-06-01', precision: 'day' }
 * @example parseDate('Aug 2021', 2026) // { day: '2021-08-01', precision: 'month' }
 * @example parseDate('31/02/2020', 2026) // 'impossible'
 */
export function parseDate(text: string, thisYear: number): ParsedDate {
  for (const [pattern, read] of FORMS) {
    const match = pattern.exec(text)
    if (!match) continue
    const parsed = read(match.slice(1), thisYear)
    if (parsed !== 'other') return parsed
  }
  return 'other'
}
