/** A version of the method: plain data that can be kept, compared, edited as a new version, and rolled back. */
import { type Basis, type Hazard } from './assessment'
import { type Beliefs } from './beliefs'
import { type SpreadOfHarm } from './harm-score'
import { type NationalAverage } from './national-averages'

export const HAZARDS = ['electrical', 'fire'] as const satisfies readonly Hazard[]

/** Every row of the shift table, by the fact it is about. */
export const SHIFT_KEYS = [
  'board-type/rewireable',
  'board-type/mixed',
  'board-type/cartridge',
  'board-type/breakers',
  'board-type/rcbo',
  'rcd-cover/none',
  'rcd-cover/sockets',
  'rcd-cover/part',
  'rcd-cover/all',
  'wiring/lead',
  'wiring/rubber',
  'wiring/mixed',
  'wiring/mineral',
  'wiring/pvc',
  // wiring this many years old; in between, along a straight line
  'wiring-age/0',
  'wiring-age/25',
  'wiring-age/40',
  'wiring-age/60',
  // the last day of a report's term; before it, in proportion to the part of the term gone
  'inspection/term-end',
  // added for each year lapsed, and the most that a lapsed report can reach
  'inspection/lapsed-year',
  'inspection/lapsed-most',
  'inspection/never',
  // the first open defect of a code, and what any number of them comes near to
  'defects/C1-first',
  'defects/C1-most',
  'defects/C2-first',
  'defects/C2-most',
  'defects/FI-first',
  'defects/FI-most',
  'defects/C3-first',
  'defects/C3-most',
  'dwelling-type/bedsit',
] as const
export type ShiftKey = (typeof SHIFT_KEYS)[number]

export type StepsByHazard = Readonly<Record<Hazard, number>>

export type ShiftRow = {
  readonly key: ShiftKey
  /** steps along the likelihood scale, in hundredths at the finest; above 0 is likelier than the reference home */
  readonly steps: StepsByHazard
  readonly reason: string
  readonly basis: Basis
  readonly source: string
}

export type SpreadRow = { readonly spread: SpreadOfHarm; readonly basis: Basis; readonly source: string }

export type Method = {
  readonly version: string
  readonly averages: readonly NationalAverage[]
  readonly shifts: readonly ShiftRow[]
  readonly spreads: Readonly<Record<Hazard, SpreadRow>>
  /** part of the national likelihood that a hazard's shifts bear on: all of it, or the electrical part of fire */
  readonly share: Readonly<
    Record<Hazard, { readonly part: number; readonly basis: Basis; readonly source: string }>
  >
  /** years that a report covers where it does not say */
  readonly usualTermYears: number
  readonly beliefs: Beliefs
}
