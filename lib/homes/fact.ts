/**
 * A fact about a home: a kind, a value or "not known", where it came from and when it was true.
 * Facts are never overwritten; a newer one supersedes an older one and both stay.
 */
import { type PartialDate } from '@/lib/calendar/partial-date'

/** Facts that the register keeps. The value is text; its reading is in the kind's own file beside this one. */
export const FACT_KINDS = [
  'board-type', // BoardType
  'rcd-cover', // RcdCover
  'ways', // board strip code, see lib/electrical/consumer-unit
  'wiring', // Wiring
  'rewired', // year, four digits
  'built', // "1931", "1960/1969", "~1895/1905", "../1939": see year-built-text
  'dwelling-type', // DwellingType
  'bedrooms', // whole number
  'inspection-record', // 'reported' | 'never'
] as const
export type FactKind = (typeof FACT_KINDS)[number]

export const FACT_SOURCES = ['inspection', 'import', 'officer', 'inferred'] as const
export type FactSource = (typeof FACT_SOURCES)[number]

export const FACT_NAMES: Record<FactKind, string> = {
  'board-type': 'Consumer unit',
  'rcd-cover': 'RCD cover',
  ways: 'Ways',
  wiring: 'Wiring',
  rewired: 'Rewired',
  built: 'Built',
  'dwelling-type': 'Dwelling',
  bedrooms: 'Bedrooms',
  'inspection-record': 'Inspection record',
}

export type Fact = {
  readonly kind: FactKind
  /** null: it is known that this is not known */
  readonly value: string | null
  readonly source: FactSource
  /** when it was true, as far as that is known */
  readonly asOf: PartialDate | null
  /** a few words of where it came from: "stock-list.xlsx, row 14" */
  readonly note: string | null
}
