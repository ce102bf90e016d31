/** A home of the demo: what a stock list says of it, and what inspections and officers have added since. Types only. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { type Fact } from '@/lib/homes/fact'
import { type HomeDraft } from '@/lib/imports/home-draft'

export type DemoDefect = {
  readonly code: ClassificationCode
  readonly description: string
  readonly location: string | null
  /** null: still open */
  readonly closed: { readonly on: CalendarDay; readonly note: string } | null
}

/** One inspection with the facts that its report settles and the defects that it raised. */
export type DemoInspection = {
  readonly inspectedOn: PartialDate
  readonly assessment: 'satisfactory' | 'unsatisfactory' | null
  readonly nextDueOn: CalendarDay | null
  readonly note: string | null
  readonly facts: readonly Fact[]
  readonly defects: readonly DemoDefect[]
}

export type DemoHome = {
  readonly draft: HomeDraft
  /** the oldest first; their facts take the place of the stock list's, and each other's */
  readonly inspections: readonly DemoInspection[]
  /** what an officer put right after them */
  readonly corrections: readonly Fact[]
  /** what an officer saw between inspections */
  readonly officerDefects: readonly (DemoDefect & { readonly raisedOn: CalendarDay })[]
}
