import { FACT_KINDS, type FactKind } from '@/lib/homes/fact'

/** Kinds that are chosen from a list, where "not known" is one of the choices; the others are typed, or left empty. */
export const CHOSEN_KINDS = [
  'board-type',
  'rcd-cover',
  'wiring',
  'dwelling-type',
  'inspection-record',
] as const satisfies readonly FactKind[]
export type ChosenKind = (typeof CHOSEN_KINDS)[number]
export type TypedKind = Exclude<FactKind, ChosenKind>

const isChosen = (kind: FactKind) => (CHOSEN_KINDS as readonly FactKind[]).includes(kind)

/** The field beside a fact's own that holds what it was when the page was opened. */
export const wasField = (kind: FactKind) => `was-${kind}`
/** The field that holds the id of the fact that was on screen. */
export const seenField = (kind: FactKind) => `seen-${kind}`

/** What a fact's field holds for a value of the register. */
export const fieldValue = (kind: FactKind, value: string | null): string =>
  value ?? (isChosen(kind) ? 'unknown' : '')

type Fields = Readonly<Record<string, unknown>>

/** Whether a person has changed a fact's field, against what it was when the page was opened. */
export const isTouched = (fields: Fields, kind: FactKind): boolean => fields[kind] !== fields[wasField(kind)]

/** Ways are written in capitals, with or without blanks between them. */
const tidied = (fields: Fields): Fields =>
  typeof fields.ways === 'string'
    ? { ...fields, ways: fields.ways.replace(/\s+/g, '').toUpperCase() }
    : fields

/**
 * A sent form without the facts that nobody touched: what another person changed meanwhile is left alone, and does
 * not stand in the way.
 * @example touchedFacts({ wiring: 'pvc', 'was-wiring': 'pvc', rewired: '1998', 'was-rewired': '' })
 * // { rewired: '1998', 'was-rewired': '' }
 */
export function touchedFacts(given: unknown): unknown {
  if (typeof given !== 'object' || given === null) return given
  const fields = tidied(given as Fields)
  const untouched = FACT_KINDS.filter((kind) => !isTouched(fields, kind)).flatMap((kind) => [
    kind,
    wasField(kind),
    seenField(kind),
  ])
  return Object.fromEntries(Object.entries(fields).filter(([name]) => !untouched.includes(name)))
}
