/** What the screens of one home are given. Types only; `show-home` gives this and more. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type IntervalRule } from '@/lib/duties/interval-rules'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { type Fact, type FactKind, type FactSource } from '@/lib/homes/fact'
import { type HomeRow } from '@/lib/homes/home-row'
import { type Assessment } from '@/lib/risk/assessment'

/** Who put something on record, and when. */
export type OnRecord = { readonly recordedBy: string | null; readonly recordedAt: Date }

export type FactShown = Fact & OnRecord & { readonly id: string }

/** One kind of fact: what holds now, and what it superseded, the newest first. */
export type FactHistoryShown = {
  readonly kind: FactKind
  readonly current: FactShown | null
  readonly before: readonly FactShown[]
}

export type InspectionShown = OnRecord & {
  readonly id: string
  readonly inspectedOn: PartialDate
  readonly assessment: 'satisfactory' | 'unsatisfactory' | null
  /** as the report says */
  readonly nextDueOn: CalendarDay | null
  readonly source: FactSource
  readonly note: string | null
  readonly withdrawnAt: Date | null
}

export type DefectShown = OnRecord & {
  readonly id: string
  readonly code: ClassificationCode
  readonly description: string
  readonly location: string | null
  readonly source: FactSource
  readonly raisedOn: PartialDate | null
  readonly closedOn: CalendarDay | null
  readonly closedNote: string | null
  readonly closedBy: string | null
}

export type StandingShown = {
  readonly reason: string
  readonly rule: IntervalRule
  readonly citation: string
  readonly decidedBy: 'law' | 'report' | null
  /** false where the tenure takes the home out of the landlord's duty */
  readonly isOwed: boolean
}

export type ScoreShown = {
  readonly on: CalendarDay
  readonly score: number
  readonly low: number
  readonly high: number
  readonly methodVersion: string
}

/** The other homes of its block. */
export type NeighboursShown = {
  readonly homes: number
  readonly withRewireableWays: number
  readonly unknown: number
  readonly lapsed: number
}

export type HomeShown = {
  readonly home: HomeRow
  readonly note: string | null
  readonly standing: StandingShown
  readonly facts: readonly FactHistoryShown[]
  readonly inspections: readonly InspectionShown[]
  readonly openDefects: readonly DefectShown[]
  readonly closedDefects: readonly DefectShown[]
  readonly assessment: Assessment | null
  readonly rank: { readonly place: number; readonly of: number }
  readonly scoreHistory: readonly ScoreShown[]
  readonly neighbours: NeighboursShown | null
  readonly mayEdit: boolean
}
