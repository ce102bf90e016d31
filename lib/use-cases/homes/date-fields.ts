/** Dates in forms: day, month and year apart (`name-day`, `name-month`, `name-year`), or an ISO 8601 text from the API. */
import { z } from 'zod'
import { type CalendarDay, dayOf, isRealDay } from '@/lib/calendar/calendar-day'
import { type PartialDate, type Precision } from '@/lib/calendar/partial-date'
import { monthOfWord } from '@/lib/imports/month-of-word'

type Typed = { readonly day: string; readonly month: string; readonly year: string }

const PARTS = ['day', 'month', 'year'] as const
const text = (value: unknown) => (typeof value === 'string' ? value.trim() : '')

/**
 * Gathers the three inputs of each named date into one value, before a schema reads the form. A date that was
 * left empty becomes null.
 * @example gatherDates(['on'])({ 'on-day': '1', 'on-month': 'dec', 'on-year': '2026' }) // { on: { day: '1', ... }, ... }
 */
export const gatherDates = (names: readonly string[]) => (given: unknown) => {
  if (typeof given !== 'object' || given === null) return given
  const fields: Record<string, unknown> = { ...given }
  for (const name of names) {
    const typed = Object.fromEntries(PARTS.map((part) => [part, text(fields[`${name}-${part}`])]))
    if (Object.values(typed).some((part) => part !== '')) fields[name] = typed
    else if (fields[name] === undefined || fields[name] === '') fields[name] = null
  }
  return fields
}

/** "3", "March" or "mar" as the number of a month [1 to 12], else null. */
const monthOf = (typed: string): number | null =>
  /^\d{1,2}$/.test(typed) ? Number(typed) : monthOfWord(typed)

const typedOf = (iso: string): Typed => {
  const [year = '', month = '', day = ''] = iso.split('-')
  return { year, month, day }
}

/** The date that was typed, or what is wrong with it, in words that follow "the date". */
function read({ day, month, year }: Typed): PartialDate | string {
  if (!/^\d{4}$/.test(year)) return 'needs a year with four digits, such as 2021'
  if (month === '') return day === '' ? partly(Number(year), 1, 1, 'year') : 'has a day but no month'
  const number = monthOf(month)
  if (number === null || number < 1 || number > 12) return 'has a month that does not exist'
  if (day === '') return partly(Number(year), number, 1, 'month')
  if (!/^\d{1,2}$/.test(day) || !isRealDay(Number(year), number, Number(day)))
    return 'does not exist in the calendar'
  return partly(Number(year), number, Number(day), 'day')
}

const partly = (year: number, month: number, day: number, precision: Precision): PartialDate | string =>
  year >= 1900 && year <= 2100
    ? { day: dayOf(year, month, day), precision }
    : 'needs a year between 1900 and 2100'

const Typed = z.union([
  z
    .string()
    .regex(/^\d{4}(-\d{2}(-\d{2})?)?$/)
    .transform(typedOf),
  z.object({ day: z.string(), month: z.string(), year: z.string() }),
])

/** Reads what was given; says what is wrong with it through `refuse`. */
function readGiven(given: unknown, refuse: (problem: string) => void): PartialDate | undefined {
  const typed = Typed.safeParse(given)
  const result = typed.success ? read(typed.data) : 'could not be read'
  if (typeof result !== 'string') return result
  refuse(result)
  return undefined
}

const dateField = <Result>(
  what: string,
  finish: (date: PartialDate | undefined, refuse: (problem: string) => void) => Result,
) =>
  z.unknown().transform((given, context): Result => {
    let refused = false
    const refuse = (problem: string) => {
      refused = true
      context.addIssue({ code: 'custom', message: `${what} ${problem}.` })
    }
    const date = given === undefined || given === null ? undefined : readGiven(given, refuse)
    const result = refused ? undefined : finish(date, refuse)
    return refused ? z.NEVER : (result as Result)
  })

const there = <T>(value: T | undefined, refuse: (problem: string) => void) => {
  if (value === undefined) refuse('is missing')
  return value as T
}
const toTheDay = (date: PartialDate | undefined, refuse: (problem: string) => void) => {
  if (date && date.precision !== 'day') refuse('needs its day and month too')
  return date?.day
}

/**
 * A date that may be known to the month or year only.
 * @param what begins the sentence that says what is wrong: "The date of the inspection"
 */
export const partialDateField = (what: string) => dateField<PartialDate>(what, there)

/** The same, or undefined where none was given. */
export const optionalPartialDate = (what: string) =>
  dateField<PartialDate | undefined>(what, (date) => date).optional()

/** A date that must be known to the day. @param what as for partialDateField */
export const dayField = (what: string) =>
  dateField<CalendarDay>(what, (date, refuse) => there(toTheDay(date, refuse), refuse))

/** The same, or undefined where none was given. */
export const optionalDay = (what: string) => dateField<CalendarDay | undefined>(what, toTheDay).optional()
