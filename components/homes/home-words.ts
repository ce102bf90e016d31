/** Figures and moments of one home as they are read. */
import { dayOf } from '@/lib/calendar/calendar-day'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { type FactSource } from '@/lib/homes/fact'

export const whole = (n: number): string => Math.round(n).toLocaleString('en-GB')

/**
 * A number with what it counts.
 * @example countOf(1, 'home') // '1 home'
 */
export const countOf = (n: number, one: string, more = `${one}s`): string =>
  `${whole(n)} ${n === 1 ? one : more}`

const ENDINGS: Partial<Record<Intl.LDMLPluralRule, string>> = { one: 'st', two: 'nd', few: 'rd' }
const ORDER = new Intl.PluralRules('en-GB', { type: 'ordinal' })

/**
 * A place in an order.
 * @example ordinal(3) // '3rd'
 * @example ordinal(1112) // '1,112th'
 */
export const ordinal = (n: number): string => `${whole(n)}${ENDINGS[ORDER.select(n)] ?? 'th'}`

/**
 * Steps along the likelihood scale with their sign, to one place, so that a column of them lines up.
 * @example stepsInWords(2.25) // '+2.3'
 * @example stepsInWords(-1) // '−1.0'
 * @example stepsInWords(0.01) // '0.0'
 */
export function stepsInWords(steps: number): string {
  const tenths = Math.round(Math.abs(steps) * 10)
  const sign = tenths === 0 ? '' : steps < 0 ? '−' : '+'
  return `${sign}${(tenths / 10).toFixed(1)}`
}

const LONDON = new Intl.DateTimeFormat('en-GB', {
  timeZone: 'Europe/London',
  year: 'numeric',
  month: 'numeric',
  day: 'numeric',
})

/**
 * The day of a moment, as it was in London.
 * @example momentInWords(new Date('2026-06-30T23:30:00Z')) // '1 July 2026'
 */
export function momentInWords(moment: Date): string {
  const parts = Object.fromEntries(
    LONDON.formatToParts(moment).map(({ type, value }) => [type, Number(value)]),
  )
  return dayInWords(dayOf(parts.year ?? 0, parts.month ?? 0, parts.day ?? 0))
}

/** Where something on record comes from. */
export const SOURCE_NAMES: Record<FactSource, string> = {
  inspection: 'Inspection',
  import: 'Imported list',
  officer: 'Officer',
  inferred: 'Inferred',
}
