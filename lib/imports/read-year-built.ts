/** The year a home was built, as the interval of years that people's words leave open. */
import { UNKNOWN_YEAR, type YearBuilt } from '@/lib/homes/year-built'
import { type Cell } from './cell'
import { cellText, isDateSerial, isErrorCell } from './cell-text'
import { saysUnknown } from './fold-words'
import { parseDate } from './parse-date'
import { found, type Reading, wrong } from './reading'
import { serialDay } from './serial-day'

/** "Circa" leaves this much open on either side [years; our judgement]. */
const ABOUT = 5
const FIRST_YEAR = 1000

const span = (from: number | null, to: number | null, about = false): YearBuilt => ({ from, to, about })

/**
 * Ages by name.
 * @source reigns: Victoria 1837 to 1901, Edward VII 1901 to 1910, the Georges 1714 to 1837; the wars of 1914 to 1918
 * and 1939 to 1945; the rest is common practice, no source
 */
const ERAS: readonly (readonly [RegExp, YearBuilt])[] = [
  [/inter[\s-]*war|between the wars/, span(1919, 1939)],
  [/pre[\s-]*(?:ww\s*(?:1|i)|first world war|great war)\b/, span(null, 1913)],
  [/pre[\s-]*(?:ww\s*(?:2|ii)|second world war|war)\b/, span(null, 1939)],
  [/post[\s-]*(?:ww\s*(?:2|ii)|second world war|war)\b/, span(1945, null)],
  [/early[\s-]*victorian/, span(1837, 1860)],
  [/mid[\s-]*victorian/, span(1850, 1880)],
  [/late[\s-]*victorian/, span(1870, 1901)],
  [/victorian/, span(1837, 1901)],
  [/edwardian/, span(1901, 1914)],
  [/georgian|regency/, span(1714, 1837)],
]

type Form = readonly [RegExp, (parts: readonly string[]) => YearBuilt | null]
const CLOSED = String.raw`(\d{4})\s*(?:-|–|—|to|/|and|&)\s*(\d{4}|\d{2})`
const BEFORE = '(?:pre|before|prior to|earlier than|up to|until|<)'
const AFTER = '(?:post|after|since|later than|>)'

const FORMS: readonly Form[] = [
  [/^(\d{4})(?:\.0+)?$/, ([year]) => span(Number(year), Number(year))],
  [
    new RegExp(`^(?:between\\s+)?${CLOSED}$`),
    ([from = '', to = '']) => {
      const last = to.length === 2 ? Number(from.slice(0, 2) + to) : Number(to)
      return last < Number(from) ? null : span(Number(from), last)
    },
  ],
  [/^(?:the\s+)?(\d{3})0\s*'?s$/, ([decade]) => span(Number(decade) * 10, Number(decade) * 10 + 9)],
  [/^'?([2-9])0\s*'?s$/, ([decade]) => span(1900 + Number(decade) * 10, 1909 + Number(decade) * 10)],
  [/^early\s+(\d{3})0\s*'?s$/, ([decade]) => span(Number(decade) * 10, Number(decade) * 10 + 4)],
  [/^mid[\s-]+(\d{3})0\s*'?s$/, ([decade]) => span(Number(decade) * 10 + 3, Number(decade) * 10 + 7)],
  [/^late\s+(\d{3})0\s*'?s$/, ([decade]) => span(Number(decade) * 10 + 5, Number(decade) * 10 + 9)],
  [
    /^(1[0-9]|2[01])th\s*(?:c\.?|century)$/,
    ([century]) => span(Number(century) * 100 - 99, Number(century) * 100),
  ],
  [new RegExp(`^${BEFORE}[\\s-]*(\\d{4})$`), ([year]) => span(null, Number(year) - 1)],
  [new RegExp(`^${AFTER}[\\s-]*(\\d{4})$`), ([year]) => span(Number(year) + 1, null)],
  [
    /^(?:from\s+)?(\d{4})\s*(?:\+|on|onwards?|or later|and later|and after)$/,
    ([year]) => span(Number(year), null),
  ],
  [/^(\d{4})\s*(?:or earlier|and earlier|and before)$/, ([year]) => span(null, Number(year))],
]

/** Age bands are often told with a letter or a nation before the years: "D: 1950-1966", "England: 1930-1949". */
const BAND = /^(?:[a-z][a-z\s,&]*:|[abd-m](?=[\s(-]+(?:\d{4}|pre|before|post|after)))[\s(-]*/

function inWords(given: string): YearBuilt | null {
  const text = given.replace(BAND, '').replace(/^\(|(?<=\d)\)$/g, '')
  const circa =
    /^(?:c(?:a|irca)?(?=[\s.\d])\.?|approx(?:imately|\.)?|about|around|est(?:imated|\.)?|~)\s*/.exec(text)
  const bare = (circa ? text.slice(circa[0].length) : text).replace(/\s*(?:\?+|\(?(?:approx|est)\.?\)?)$/, '')
  const about = circa !== null || bare !== text
  for (const [pattern, read] of FORMS) {
    const match = pattern.exec(bare)
    const interval = match && read(match.slice(1))
    if (!interval) continue
    if (!about || interval.from === null || interval.to === null) return interval
    const single = interval.from === interval.to
    return span(interval.from - (single ? ABOUT : 0), interval.to + (single ? ABOUT : 0), true)
  }
  return ERAS.find(([pattern]) => pattern.test(bare))?.[1] ?? null
}

function within(interval: YearBuilt, thisYear: number): Reading<YearBuilt> {
  const first = interval.from ?? interval.to ?? thisYear
  if (first > thisYear) return wrong('year in the future')
  if ((interval.from ?? FIRST_YEAR) < FIRST_YEAR || (interval.to ?? FIRST_YEAR) < FIRST_YEAR)
    return wrong('not a year')
  return found(interval.to !== null && interval.to > thisYear ? { ...interval, to: thisYear } : interval)
}

/**
 * The year, or the interval of years, in which a home was built.
 * @param thisYear nothing is built later than this
 * @example readYearBuilt('1960s', 2026) // { from: 1960, to: 1969, about: false }
 * @example readYearBuilt('c.1900', 2026) // { from: 1895, to: 1905, about: true }
 * @example readYearBuilt('pre war', 2026) // { from: null, to: 1939, about: false }
 */
export function readYearBuilt(cell: Cell, thisYear: number): Reading<YearBuilt> {
  if (isErrorCell(cell)) return wrong('formula error')
  if (isDateSerial(cell)) {
    const year = Number(serialDay(cell.serial, cell.epoch)?.slice(0, 4) ?? 0)
    // A year typed into a cell that shows dates is a serial of a day in 1905.
    return year === 1905 ? wrong('not a year') : within(span(year, year), thisYear)
  }
  const text = cellText(cell).toLowerCase().replaceAll('’', "'")
  if (saysUnknown(text)) return found(UNKNOWN_YEAR)
  const interval = inWords(text)
  if (interval) return within(interval, thisYear)
  const date = parseDate(text, thisYear)
  if (typeof date === 'object')
    return within(span(Number(date.day.slice(0, 4)), Number(date.day.slice(0, 4))), thisYear)
  if (date === 'impossible' || /^[\d\s.,/-]+$/.test(text)) return wrong('not a year')
  return found(UNKNOWN_YEAR, 'year built not understood')
}
