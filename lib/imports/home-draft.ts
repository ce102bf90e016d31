/** What one row of a stock list says of one home, once read. Types only. */
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type BoardType } from '@/lib/homes/board-type'
import { type DwellingType } from '@/lib/homes/dwelling-type'
import { type Nation } from '@/lib/homes/nation'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type InspectionRecord } from '@/lib/homes/standing'
import { type Tenure } from '@/lib/homes/tenure'
import { type Wiring } from '@/lib/homes/wiring'
import { type YearBuilt } from '@/lib/homes/year-built'

/** Columns that an import understands. `ignore` keeps a column out. */
export const IMPORT_FIELDS = [
  'reference',
  'uprn',
  'kind',
  'block',
  'number',
  'street',
  'address',
  'town',
  'postcode',
  'patch',
  'nation',
  'tenure',
  'built',
  'dwelling-type',
  'bedrooms',
  'board-type',
  'rcd-cover',
  'ways',
  'wiring',
  'rewired',
  'last-inspection',
  'assessment',
  'next-due',
  'open-c1',
  'open-c2',
  'open-c3',
  'open-fi',
  'easting',
  'northing',
  'grid-reference',
  'latitude',
  'longitude',
  'note',
] as const
export type ImportField = (typeof IMPORT_FIELDS)[number]

/** Which column [0 upwards] holds which field. */
export type Mapping = Partial<Record<ImportField, number>>

export type HomeDraft = {
  readonly row: number
  readonly kind: 'dwelling' | 'communal'
  readonly reference: string | null
  readonly uprn: string | null
  readonly address: string
  readonly town: string | null
  readonly postcode: string | null
  /** folded address and postcode: the same for the same home however it is typed */
  readonly addressKey: string
  readonly block: string | null
  readonly patch: string | null
  /** null: the file does not say, so the organisation's own nation holds */
  readonly nation: Nation | null
  readonly tenure: Tenure
  readonly built: YearBuilt
  readonly dwellingType: DwellingType
  readonly bedrooms: number | null
  readonly boardType: BoardType
  readonly rcdCover: RcdCover
  readonly ways: string | null
  readonly wiring: Wiring
  readonly rewired: number | null
  readonly inspectionRecord: InspectionRecord
  readonly lastInspection: PartialDate | null
  readonly assessment: 'satisfactory' | 'unsatisfactory' | null
  readonly nextDue: CalendarDay | null
  /** null: the file does not say; 0: it says there are none */
  readonly open: {
    readonly C1: number | null
    readonly C2: number | null
    readonly C3: number | null
    readonly FI: number | null
  }
  readonly latitude: number | null
  readonly longitude: number | null
  readonly note: string | null
}

/** One thing wrong, or worth knowing, in one row. `field` is null where it concerns the whole row. */
export type RowProblem = {
  readonly row: number
  readonly field: ImportField | null
  readonly severity: 'rejected' | 'noted'
  /** short and in the person's words: "impossible date", "date known to the year" */
  readonly why: string
  readonly cell: string | null
}
