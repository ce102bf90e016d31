import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate, PRECISIONS } from '@/lib/calendar/partial-date'

/** What the register needs of an inspection to say where a home stands. */
export type InspectionOnRecord = {
  readonly inspectedOn: PartialDate
  /** as the inspector states it; null: not known */
  readonly assessment: 'satisfactory' | 'unsatisfactory' | null
  /** the next inspection date that the report states, if any */
  readonly nextDueOn: CalendarDay | null
}

/**
 * The latest of some inspections, by the first day that each can have been on; null where there is none.
 * Of two on the same day the one known more exactly counts, then the worse news: unsatisfactory before
 * not known before satisfactory, and the sooner next date. The order in which they are given never matters.
 * @example latestInspection([of2016, of2021])?.inspectedOn.day // '2021-03-14'
 */
export function latestInspection(inspections: readonly InspectionOnRecord[]): InspectionOnRecord | null {
  return [...inspections].sort(latestFirst)[0] ?? null
}

const ASSESSMENTS = ['unsatisfactory', null, 'satisfactory'] as const

function latestFirst(a: InspectionOnRecord, b: InspectionOnRecord): number {
  return (
    compare(b.inspectedOn.day, a.inspectedOn.day) ||
    PRECISIONS.indexOf(a.inspectedOn.precision) - PRECISIONS.indexOf(b.inspectedOn.precision) ||
    ASSESSMENTS.indexOf(a.assessment) - ASSESSMENTS.indexOf(b.assessment) ||
    compare(a.nextDueOn ?? '9999', b.nextDueOn ?? '9999')
  )
}

const compare = (a: string, b: string) => (a === b ? 0 : a < b ? -1 : 1)
