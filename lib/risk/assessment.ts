/** What a score is made of, so that it can explain itself. Types only. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type BoardType } from '@/lib/homes/board-type'
import { type DwellingType } from '@/lib/homes/dwelling-type'
import { type Nation } from '@/lib/homes/nation'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type InspectionRecord } from '@/lib/homes/standing'
import { type Wiring } from '@/lib/homes/wiring'
import { type YearBuilt } from '@/lib/homes/year-built'

/** The facts that the method reads. Unknown is a value in each of them. */
export type RiskFacts = {
  readonly nation: Nation
  readonly built: YearBuilt
  readonly dwellingType: DwellingType
  readonly boardType: BoardType
  readonly rcdCover: RcdCover
  readonly wiring: Wiring
  readonly rewired: number | null
  readonly inspectionRecord: InspectionRecord
  readonly inspectedOn: PartialDate | null
  /** last day that the report covers */
  readonly dueOn: CalendarDay | null
  readonly open: { readonly C1: number; readonly C2: number; readonly C3: number; readonly FI: number }
}

/** The hazards of the published method that electrical facts bear on. */
export type Hazard = 'electrical' | 'fire'

/** `published`: printed in a named source. `judgement`: ours, stated, and open to change. */
export type Basis = 'published' | 'judgement'

/** Which unknown a range comes from. */
export type RiskFactName =
  'board-type' | 'rcd-cover' | 'wiring' | 'rewired' | 'built' | 'inspection' | 'dwelling-type'

/** One move of the likelihood along the published scale. */
export type Shift = {
  readonly fact: RiskFactName | 'defects'
  /** steps along the scale; above zero is likelier */
  readonly steps: number
  /** a few words for the person who reads it: "Rewireable fuses" */
  readonly reason: string
  readonly basis: Basis
  readonly source: string
  /** true where the fact is not known and the steps are those of the mean likelihood over what it could be */
  readonly unknown: boolean
}

export type HazardAssessment = {
  readonly hazard: Hazard
  readonly base: {
    readonly oneIn: number
    readonly words: string
    readonly basis: Basis
    readonly source: string
  }
  readonly shifts: readonly Shift[]
  /** mean, and the 5 and 95 % points over what the unknown facts could be */
  readonly score: number
  readonly low: number
  readonly high: number
  /** the likelihood that gives the mean score, 1 in this many */
  readonly oneIn: number
  /** percent of harm outcomes, extreme to moderate; adds to 100 */
  readonly spread: readonly [number, number, number, number]
  readonly spreadBasis: Basis
}

/** A home's score: the higher of its hazards, each scored by the published formula. */
export type Assessment = {
  readonly methodVersion: string
  readonly assessedOn: CalendarDay
  readonly score: number
  readonly low: number
  readonly high: number
  readonly hazards: readonly HazardAssessment[]
  readonly unknowns: readonly RiskFactName[]
}
