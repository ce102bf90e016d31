/** Facts of homes: dated, sourced, never overwritten. One of each kind is current; the others are its history. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Precision } from '@/lib/calendar/partial-date'
import { type Fact, type FactKind, type FactSource } from '@/lib/homes/fact'
import { type Scope, type WritingScope } from '@/db/connection'
import { insertRows, type Value } from './insert-rows'

/** A fact as it is kept. */
export type HomeFact = Fact & { readonly id: string; readonly homeId: string }

/** A fact with who put it on record, when, and whether it still stands. */
export type FactOnRecord = HomeFact & {
  readonly current: boolean
  readonly recordedBy: string | null
  readonly recordedAt: Date
}

export type NewFact = HomeFact & { readonly recordedBy: string | null }

type Row = {
  id: string
  home_id: string
  kind: FactKind
  value: string | null
  source: FactSource
  as_of: CalendarDay | null
  as_of_precision: Precision | null
  note: string | null
}

const toFact = (row: Row): HomeFact => ({
  id: row.id,
  homeId: row.home_id,
  kind: row.kind,
  value: row.value,
  source: row.source,
  asOf: row.as_of === null ? null : { day: row.as_of, precision: row.as_of_precision ?? 'day' },
  note: row.note,
})

/** The current facts of some homes, in no order. */
export async function listCurrent(scope: Scope, homeIds: readonly string[]): Promise<HomeFact[]> {
  if (homeIds.length === 0) return []
  const rows = (await scope
    .db('home_facts')
    .where({ organisation_id: scope.organisationId, is_current: true })
    .whereIn('home_id', [...homeIds])
    .select('id', 'home_id', 'kind', 'value', 'source', 'as_of', 'as_of_precision', 'note')) as Row[]
  return rows.map(toFact)
}

type RecordRow = Row & { is_current: number | null; recorded_at: Date; person_name: string | null }

/** Every fact of one home, current ones first, then the newest on record first. */
export async function listForHome(scope: Scope, homeId: string): Promise<FactOnRecord[]> {
  const rows = (await scope
    .db('home_facts as fact')
    .leftJoin('people as person', 'person.id', 'fact.recorded_by')
    .where({ 'fact.organisation_id': scope.organisationId, 'fact.home_id': homeId })
    .orderByRaw('fact.is_current is null, fact.recorded_at desc, fact.id desc')
    .select('fact.*', 'person.name as person_name')) as RecordRow[]
  return rows.map((row) => ({
    ...toFact(row),
    current: row.is_current !== null,
    recordedBy: row.person_name,
    recordedAt: row.recorded_at,
  }))
}

/** Makes facts history: they stay, and are current no more. */
export async function supersede(
  scope: WritingScope,
  facts: readonly Pick<HomeFact, 'homeId' | 'id'>[],
): Promise<void> {
  if (facts.length === 0) return
  await scope
    .db('home_facts')
    .where({ organisation_id: scope.organisationId })
    .whereIn('home_id', [...new Set(facts.map((fact) => fact.homeId))])
    .whereIn(
      'id',
      facts.map((fact) => fact.id),
    )
    .update({ is_current: null })
}

const COLUMNS = [
  'organisation_id',
  'home_id',
  'id',
  'kind',
  'value',
  'source',
  'as_of',
  'as_of_precision',
  'note',
  'recorded_by',
] as const

/** Adds facts as the current ones; what they replace must have been superseded before. */
export async function insertMany(scope: WritingScope, facts: readonly NewFact[]): Promise<void> {
  const rows = facts.map((fact): Value[] => [
    scope.organisationId,
    fact.homeId,
    fact.id,
    fact.kind,
    fact.value,
    fact.source,
    fact.asOf?.day ?? null,
    fact.asOf?.precision ?? null,
    fact.note,
    fact.recordedBy,
  ])
  await insertRows(scope.db, 'home_facts', COLUMNS, rows)
}
