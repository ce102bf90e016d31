/** Inspections of homes, as their reports state them. One that was entered wrongly is withdrawn, never deleted. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate, type Precision } from '@/lib/calendar/partial-date'
import { type Scope, type WritingScope } from '@/db/connection'
import { insertRows, type Value } from './insert-rows'

export type Inspection = {
  readonly id: string
  readonly homeId: string
  readonly inspectedOn: PartialDate
  readonly assessment: 'satisfactory' | 'unsatisfactory' | null
  /** as the report says */
  readonly nextDueOn: CalendarDay | null
  readonly source: 'inspection' | 'import' | 'officer'
  readonly note: string | null
}

export type InspectionOnRecord = Inspection & {
  readonly recordedBy: string | null
  readonly recordedAt: Date
  readonly withdrawnAt: Date | null
}

type Row = {
  id: string
  home_id: string
  inspected_on: CalendarDay
  inspected_precision: Precision
  assessment: Inspection['assessment']
  next_due_on: CalendarDay | null
  source: Inspection['source']
  note: string | null
}

const READ = [
  'id',
  'home_id',
  'inspected_on',
  'inspected_precision',
  'assessment',
  'next_due_on',
  'source',
  'note',
]

const toInspection = (row: Row): Inspection => ({
  id: row.id,
  homeId: row.home_id,
  inspectedOn: { day: row.inspected_on, precision: row.inspected_precision },
  assessment: row.assessment,
  nextDueOn: row.next_due_on,
  source: row.source,
  note: row.note,
})

/** The inspections of some homes that stand, in no order. */
export async function listLive(scope: Scope, homeIds: readonly string[]): Promise<Inspection[]> {
  if (homeIds.length === 0) return []
  const rows = (await scope
    .db('inspections')
    .where({ organisation_id: scope.organisationId })
    .whereIn('home_id', [...homeIds])
    .whereNull('withdrawn_at')
    .select(READ)) as Row[]
  return rows.map(toInspection)
}

/** Every inspection of one home, withdrawn ones too, newest first. */
export async function listForHome(scope: Scope, homeId: string): Promise<InspectionOnRecord[]> {
  const rows = (await scope
    .db('inspections as inspection')
    .leftJoin('people as person', 'person.id', 'inspection.recorded_by')
    .where({ 'inspection.organisation_id': scope.organisationId, 'inspection.home_id': homeId })
    .orderBy([
      { column: 'inspection.inspected_on', order: 'desc' },
      { column: 'inspection.recorded_at', order: 'desc' },
      { column: 'inspection.id', order: 'desc' },
    ])
    .select('inspection.*', 'person.name as person_name')) as (Row & {
    person_name: string | null
    recorded_at: Date
    withdrawn_at: Date | null
  })[]
  return rows.map((row) => ({
    ...toInspection(row),
    recordedBy: row.person_name,
    recordedAt: row.recorded_at,
    withdrawnAt: row.withdrawn_at,
  }))
}

export type NewInspection = Inspection & { readonly recordedBy: string | null }

/** Adds inspections, many to a statement. */
export async function insertMany(scope: WritingScope, inspections: readonly NewInspection[]): Promise<void> {
  const rows = inspections.map((one): Value[] => [
    scope.organisationId,
    one.homeId,
    one.id,
    one.inspectedOn.day,
    one.inspectedOn.precision,
    one.assessment,
    one.nextDueOn,
    one.source,
    one.note,
    one.recordedBy,
  ])
  const columns = ['organisation_id', 'home_id', 'id', ...READ.slice(2), 'recorded_by']
  await insertRows(scope.db, 'inspections', columns, rows)
}

/** Withdraws inspections: they stay on record, and count no more. */
export async function withdraw(
  scope: WritingScope,
  inspections: readonly Pick<Inspection, 'homeId' | 'id'>[],
  at: Date,
): Promise<void> {
  if (inspections.length === 0) return
  await scope
    .db('inspections')
    .where({ organisation_id: scope.organisationId })
    .whereIn('home_id', [...new Set(inspections.map((one) => one.homeId))])
    .whereIn(
      'id',
      inspections.map((one) => one.id),
    )
    .whereNull('withdrawn_at')
    .update({ withdrawn_at: at })
}
