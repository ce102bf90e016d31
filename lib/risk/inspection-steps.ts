/** How far the age of the last inspection moves a likelihood. */
import { type CalendarDay, partsOf } from '@/lib/calendar/calendar-day'
import { type RiskFacts } from './assessment'

const DAYS_A_YEAR = 365.25

/** The rows of the shift table that inspections use. */
export type InspectionRows = {
  readonly termEnd: number
  readonly lapsedYear: number
  readonly lapsedMost: number
  readonly never: number
}

/** `extent`: in date, the part of the term gone [0 to 1]; lapsed, the years since [above 0]. */
export type InspectionState = { readonly state: 'in date' | 'lapsed' | 'never'; readonly extent: number }

const NEVER: InspectionState = { state: 'never', extent: 0 }

function yearsOf(day: CalendarDay): number {
  const { year, month, day: date } = partsOf(day)
  return Date.UTC(year, month - 1, date) / 86_400_000 / DAYS_A_YEAR
}

/**
 * The state of a home's inspection, or null where nothing is on record. A date known to the month or year is taken
 * at its first day, the cautious reading; a report without a term is given the usual one, and one without a date
 * of inspection is taken to have run its usual term.
 */
export function inspectionStateOf(
  facts: Pick<RiskFacts, 'inspectionRecord' | 'inspectedOn' | 'dueOn'>,
  today: CalendarDay,
  usualTermYears: number,
): InspectionState | null {
  if (facts.inspectionRecord === 'never') return NEVER
  const { inspectedOn, dueOn } = facts
  if (facts.inspectionRecord === 'unknown' || (inspectedOn === null && dueOn === null)) return null
  const now = yearsOf(today)
  const recorded =
    inspectedOn === null ? Number(dueOn && yearsOf(dueOn)) - usualTermYears : yearsOf(inspectedOn.day)
  const from = Math.min(recorded, now)
  const to = dueOn === null ? from + usualTermYears : yearsOf(dueOn)
  if (now > to) return { state: 'lapsed', extent: now - to }
  return { state: 'in date', extent: to > from ? (now - from) / (to - from) : 0 }
}

/**
 * Steps for the state of an inspection: from 0 for a new report, in proportion to the term gone, then by the year
 * lapsed up to a most, and never inspected above that.
 */
export function inspectionSteps({ state, extent }: InspectionState, rows: InspectionRows): number {
  if (state === 'never') return rows.never
  if (state === 'in date') return rows.termEnd * extent
  return Math.min(Math.max(rows.lapsedMost, rows.termEnd), rows.termEnd + rows.lapsedYear * extent)
}
