/** A home as the list, the map and the export show it. Types only. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type BoardType } from './board-type'
import { type DwellingType } from './dwelling-type'
import { type Nation } from './nation'
import { type RcdCover } from './rcd-cover'
import { type InspectionRecord, type Standing } from './standing'
import { type Tenure } from './tenure'
import { type Wiring } from './wiring'
import { type YearBuilt } from './year-built'

export type HomeRow = {
  readonly id: string
  readonly kind: 'dwelling' | 'communal'
  readonly reference: string | null
  readonly uprn: string | null
  readonly address: string
  readonly town: string | null
  readonly postcode: string | null
  readonly patch: { readonly id: string; readonly name: string } | null
  readonly block: { readonly id: string; readonly name: string } | null
  readonly nation: Nation
  readonly tenure: Tenure
  readonly built: YearBuilt
  readonly dwellingType: DwellingType
  readonly bedrooms: number | null
  readonly boardType: BoardType
  readonly rcdCover: RcdCover
  /** board strip code, see lib/electrical/consumer-unit; null: only the type is known */
  readonly ways: string | null
  readonly wiring: Wiring
  readonly rewired: number | null
  readonly inspectionRecord: InspectionRecord
  readonly inspectedOn: PartialDate | null
  readonly assessment: 'satisfactory' | 'unsatisfactory' | null
  readonly dueOn: CalendarDay | null
  readonly standing: Standing
  readonly open: { readonly C1: number; readonly C2: number; readonly C3: number; readonly FI: number }
  readonly score: number
  readonly scoreLow: number
  readonly scoreHigh: number
  readonly place: { readonly latitude: number; readonly longitude: number } | null
}
