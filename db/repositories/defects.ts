/** Defects: things to be put right, each with the code that an inspector or officer gave it. Closing keeps them. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate, type Precision } from '@/lib/calendar/partial-date'
import { NotFound } from '@/lib/errors/expected'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { type Scope, type WritingScope } from '@/db/connection'
import { insertRows, type Value } from './insert-rows'

export type Defect = {
  readonly id: string
  readonly homeId: string
  readonly inspectionId: string | null
  readonly code: ClassificationCode
  readonly description: string
  readonly location: string | null
  readonly source: 'inspection' | 'import' | 'officer'
  readonly raisedOn: PartialDate | null
  readonly closedOn: CalendarDay | null
  readonly closedNote: string | null
}

export type DefectOnRecord = Defect & {
  readonly recordedBy: string | null
  readonly recordedAt: Date
  readonly closedBy: string | null
}

type Row = {
  id: string
  home_id: string
  inspection_id: string | null
  code: ClassificationCode
  description: string
  location: string | null
  source: Defect['source']
  raised_on: CalendarDay | null
  raised_precision: Precision | null
  closed_on: CalendarDay | null
  closed_note: string | null
}

const toDefect = (row: Row): Defect => ({
  id: row.id,
  homeId: row.home_id,
  inspectionId: row.inspection_id,
  code: row.code,
  description: row.description,
  location: row.location,
  source: row.source,
  raisedOn: row.raised_on === null ? null : { day: row.raised_on, precision: row.raised_precision ?? 'day' },
  closedOn: row.closed_on,
  closedNote: row.closed_note,
})

/** The open defects of some homes, in no order. */
export async function listOpen(scope: Scope, homeIds: readonly string[]): Promise<Defect[]> {
  if (homeIds.length === 0) return []
  const rows = (await scope
    .db('defects')
    .where({ organisation_id: scope.organisationId })
    .whereIn('home_id', [...homeIds])
    .whereNull('closed_on')
    .select()) as Row[]
  return rows.map(toDefect)
}

export type OpenCounts = Record<ClassificationCode, number>

/** How many open defects of each code some homes have; a home without any is left out. */
export async function countOpen(scope: Scope, homeIds: readonly string[]): Promise<Map<string, OpenCounts>> {
  const counts = new Map<string, OpenCounts>()
  if (homeIds.length === 0) return counts
  const rows = (await scope
    .db('defects')
    .where({ organisation_id: scope.organisationId })
    .whereIn('home_id', [...homeIds])
    .whereNull('closed_on')
    .groupBy('home_id', 'code')
    .select('home_id', 'code')
    .count({ open: '*' })) as unknown as { home_id: string; code: ClassificationCode; open: number }[]
  for (const row of rows) {
    const of = counts.get(row.home_id) ?? { C1: 0, C2: 0, C3: 0, FI: 0 }
    counts.set(row.home_id, { ...of, [row.code]: Number(row.open) })
  }
  return counts
}

/** Every defect of one home: open ones first, then the newest on record first. */
export async function listForHome(scope: Scope, homeId: string): Promise<DefectOnRecord[]> {
  const rows = (await scope
    .db('defects as defect')
    .leftJoin('people as recorder', 'recorder.id', 'defect.recorded_by')
    .leftJoin('people as closer', 'closer.id', 'defect.closed_by')
    .where({ 'defect.organisation_id': scope.organisationId, 'defect.home_id': homeId })
    .orderByRaw(
      "defect.closed_on is not null, field(defect.code, 'C1', 'C2', 'FI', 'C3'), defect.recorded_at desc, defect.id desc",
    )
    .select('defect.*', 'recorder.name as recorder_name', 'closer.name as closer_name')) as (Row & {
    recorder_name: string | null
    closer_name: string | null
    recorded_at: Date
  })[]
  return rows.map((row) => ({
    ...toDefect(row),
    recordedBy: row.recorder_name,
    recordedAt: row.recorded_at,
    closedBy: row.closer_name,
  }))
}

/** A defect of one home, held against other writers until the transaction ends. @throws NotFound where there is none */
export async function getForChange(scope: WritingScope, homeId: string, id: string): Promise<Defect> {
  const row = (await scope
    .db('defects')
    .where({ organisation_id: scope.organisationId, home_id: homeId, id })
    .forUpdate()
    .first()) as Row | undefined
  if (!row) throw new NotFound('That defect')
  return toDefect(row)
}

export type NewDefect = Omit<Defect, 'closedOn' | 'closedNote'> & { readonly recordedBy: string | null }

const COLUMNS = [
  'organisation_id',
  'home_id',
  'id',
  'inspection_id',
  'code',
  'description',
  'location',
  'source',
  'raised_on',
  'raised_precision',
  'recorded_by',
] as const

/** Adds open defects, many to a statement. */
export async function insertMany(scope: WritingScope, defects: readonly NewDefect[]): Promise<void> {
  const rows = defects.map((defect): Value[] => [
    scope.organisationId,
    defect.homeId,
    defect.id,
    defect.inspectionId,
    defect.code,
    defect.description,
    defect.location,
    defect.source,
    defect.raisedOn?.day ?? null,
    defect.raisedOn?.precision ?? null,
    defect.recordedBy,
  ])
  await insertRows(scope.db, 'defects', COLUMNS, rows)
}

/** Closes defects that are still open; says how many it closed. */
export async function close(
  scope: WritingScope,
  defects: readonly Pick<Defect, 'homeId' | 'id'>[],
  closing: { readonly on: CalendarDay; readonly note: string; readonly by: string | null },
): Promise<number> {
  if (defects.length === 0) return 0
  return scope
    .db('defects')
    .where({ organisation_id: scope.organisationId })
    .whereIn('home_id', [...new Set(defects.map((defect) => defect.homeId))])
    .whereIn(
      'id',
      defects.map((defect) => defect.id),
    )
    .whereNull('closed_on')
    .update({ closed_on: closing.on, closed_note: closing.note, closed_by: closing.by })
}
