/** What the register already holds of a home, as an import needs it. Types only. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { type FactKind, type FactSource } from '@/lib/homes/fact'
import { type Nation } from '@/lib/homes/nation'
import { type Tenure } from '@/lib/homes/tenure'

export type HomeIdentity = {
  readonly kind: 'dwelling' | 'communal'
  readonly reference: string | null
  readonly uprn: string | null
  readonly address: string
  readonly town: string | null
  readonly postcode: string | null
  readonly addressKey: string
  readonly nation: Nation
  readonly tenure: Tenure
  readonly patch: string | null
  readonly block: string | null
  readonly latitude: number | null
  readonly longitude: number | null
  readonly note: string | null
}

export type KnownFact = { readonly id: string; readonly value: string | null; readonly source: FactSource }

export type KnownInspection = {
  readonly id: string
  readonly inspectedOn: PartialDate
  readonly assessment: 'satisfactory' | 'unsatisfactory' | null
  readonly nextDueOn: CalendarDay | null
  readonly source: 'inspection' | 'import' | 'officer'
}

export type KnownHome = {
  readonly id: string
  readonly identity: HomeIdentity
  readonly facts: ReadonlyMap<FactKind, KnownFact>
  readonly inspections: readonly KnownInspection[]
  readonly openDefects: Readonly<Record<ClassificationCode, number>>
}
