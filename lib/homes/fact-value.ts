/** What a fact's text means, by its kind: the one place that decides whether a value is one of its kind. */
import { z } from 'zod'
import { MOST_WAYS, waysOf } from '@/lib/electrical/consumer-unit'
import { waysInWords } from '@/lib/electrical/ways-in-words'
import { Invalid } from '@/lib/errors/expected'
import { BOARD_TYPE_NAMES, BOARD_TYPES } from './board-type'
import { builtFromText, builtToText } from './built-text'
import { DWELLING_TYPE_NAMES, DWELLING_TYPES } from './dwelling-type'
import { FACT_NAMES, type FactKind } from './fact'
import { RCD_COVER_NAMES, RCD_COVERS } from './rcd-cover'
import { UNKNOWN_YEAR, yearBuiltInWords } from './year-built'
import { WIRING_NAMES, WIRINGS } from './wiring'

/** The register keeps a board strip code of this many letters and brackets at most. */
const LONGEST_WAYS = 60

const INSPECTION_RECORDS = ['reported', 'never', 'unknown'] as const
export const INSPECTION_RECORD_NAMES: Record<(typeof INSPECTION_RECORDS)[number], string> = {
  reported: 'Inspected, date not known',
  never: 'Never inspected',
  unknown: 'Not known',
}

const wholeNumber = (least: number, most: number) =>
  z
    .string()
    .regex(/^\d{1,4}$/)
    .transform(Number)
    .pipe(z.number().min(least).max(most))

/** kind: [what its text must be, what stands for "not known", the problem with any other text] */
const READINGS = {
  'board-type': [z.enum(BOARD_TYPES), 'unknown', oneOf(BOARD_TYPE_NAMES)],
  'rcd-cover': [z.enum(RCD_COVERS), 'unknown', oneOf(RCD_COVER_NAMES)],
  ways: [
    z
      .string()
      .max(LONGEST_WAYS)
      .refine((text) => waysOf(text) !== null),
    null,
    `Write one letter a way, at most ${MOST_WAYS}: R, C, B, O, X or U, with [ ] around those behind one RCD. Example: RRRR[BB]`,
  ],
  wiring: [z.enum(WIRINGS), 'unknown', oneOf(WIRING_NAMES)],
  rewired: [
    wholeNumber(1880, 2100),
    null,
    'Write the year with four digits, between 1880 and 2100. Example: 1998',
  ],
  built: [
    z.string().transform((text, context) => {
      const built = builtFromText(text)
      if (built) return built
      context.addIssue({ code: 'custom' })
      return z.NEVER
    }),
    UNKNOWN_YEAR,
    'Write a year or a span of years between 1000 and 2100, with ~ for about. Examples: 1931, 1960/1969, ~1895/1905, ../1939',
  ],
  'dwelling-type': [z.enum(DWELLING_TYPES), 'unknown', oneOf(DWELLING_TYPE_NAMES)],
  bedrooms: [wholeNumber(0, 50), null, 'Write a whole number of bedrooms from 0 to 50. Example: 3'],
  'inspection-record': [z.enum(INSPECTION_RECORDS), 'unknown', oneOf(INSPECTION_RECORD_NAMES)],
} as const satisfies Record<FactKind, readonly [z.ZodType<unknown, string>, unknown, string]>

function oneOf(names: Record<string, string>): string {
  return `Choose one of these: ${Object.values(names).join('; ')}.`
}

type Readings = typeof READINGS

/** What a fact of each kind means once it is read. */
export type FactValues = { [K in FactKind]: z.output<Readings[K][0]> | Readings[K][1] }

/** A fact's meaning with its kind, and the text that the register keeps: null where it is not known. */
export type FactReading<K extends FactKind = FactKind> = {
  [Kind in K]: { readonly kind: Kind; readonly value: FactValues[Kind]; readonly text: string | null }
}[K]

/**
 * Reads a fact's value, stored or typed. Null and an empty text mean that it is known not to be known.
 * @throws Invalid where the text is no value of that kind; the problem's field is the kind
 * @example readFactValue('board-type', 'rewireable') // { kind: 'board-type', value: 'rewireable', text: 'rewireable' }
 * @example readFactValue('bedrooms', ' 03 ') // { kind: 'bedrooms', value: 3, text: '3' }
 * @example readFactValue('built', null).value // { from: null, to: null, about: false }
 */
export function readFactValue<K extends FactKind>(kind: K, value: string | null): FactReading<K> {
  const [schema, unknown, problem] = READINGS[kind]
  const typed = (value ?? '').trim()
  const result = typed === '' ? null : schema.safeParse(typed)
  if (result && !result.success)
    throw new Invalid([{ field: kind, problem: `${FACT_NAMES[kind]}: ${problem}` }])
  const read = result ? result.data : unknown
  return { kind, value: read, text: textOf(kind, read) } as FactReading<K>
}

function textOf(kind: FactKind, value: FactValues[FactKind]): string | null {
  if (value === null || value === 'unknown') return null
  if (typeof value !== 'object') return String(value)
  return value.from === null && value.to === null ? null : builtToText(value)
}

/**
 * A fact's value as a person reads it. A stored text that is no value of its kind is shown as it stands.
 * @example factValueInWords('board-type', 'rewireable') // 'Rewireable fuses'
 * @example factValueInWords('built', '~1895/1905') // 'about 1900'
 * @example factValueInWords('wiring', null) // 'not known'
 */
export function factValueInWords(kind: FactKind, value: string | null): string {
  let reading: FactReading
  try {
    reading = readFactValue(kind, value)
  } catch (thrown) {
    if (thrown instanceof Invalid && value !== null) return value
    throw thrown
  }
  if (reading.text === null) return 'not known'
  switch (reading.kind) {
    case 'board-type':
      return BOARD_TYPE_NAMES[reading.value]
    case 'rcd-cover':
      return RCD_COVER_NAMES[reading.value]
    case 'ways':
      return waysInWords(waysOf(reading.text) ?? [])
    case 'wiring':
      return WIRING_NAMES[reading.value]
    case 'built':
      return yearBuiltInWords(reading.value)
    case 'dwelling-type':
      return DWELLING_TYPE_NAMES[reading.value]
    case 'inspection-record':
      return INSPECTION_RECORD_NAMES[reading.value]
    case 'rewired':
    case 'bedrooms':
      return reading.text
  }
}
