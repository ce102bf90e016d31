/** Imports of stock lists: the file, how it is read, how far it has got, and what came of it. */
import { NotFound } from '@/lib/errors/expected'
import { type ImportLayout } from '@/lib/imports/import-layout'
import { now } from '@/lib/platform/clock'
import { type Scope, type WritingScope } from '@/db/connection'

export const IMPORT_STATES = [
  'uploaded',
  'checking',
  'checked',
  'importing',
  'done',
  'failed',
  'cancelled',
] as const
export type ImportState = (typeof IMPORT_STATES)[number]

export type Import<Report = unknown> = {
  readonly id: string
  readonly fileName: string
  readonly fileKey: string
  readonly fileSize: number
  readonly state: ImportState
  readonly layout: ImportLayout | null
  readonly report: Report | null
  readonly failure: string | null
  /** counts the checks and the taking-in, to name their jobs */
  readonly attempt: number
  readonly rowsTotal: number | null
  readonly startedBy: string | null
  readonly createdAt: Date
  readonly finishedAt: Date | null
}

type Row = {
  id: string
  file_name: string
  file_key: string
  file_size: number
  state: ImportState
  layout: string | null
  report: string | null
  failure: string | null
  attempt: number
  rows_total: number | null
  started_by_name: string | null
  created_at: Date
  finished_at: Date | null
}

const toImport = (row: Row): Import => ({
  id: row.id,
  fileName: row.file_name,
  fileKey: row.file_key,
  fileSize: row.file_size,
  state: row.state,
  layout: row.layout === null ? null : (JSON.parse(row.layout) as ImportLayout),
  report: row.report === null ? null : (JSON.parse(row.report) as unknown),
  failure: row.failure,
  attempt: row.attempt,
  rowsTotal: row.rows_total,
  startedBy: row.started_by_name,
  createdAt: row.created_at,
  finishedAt: row.finished_at,
})

const select = (scope: Scope) =>
  scope
    .db('imports as import')
    .leftJoin('people as person', 'person.id', 'import.started_by')
    .where('import.organisation_id', scope.organisationId)
    .select('import.*', 'person.name as started_by_name')

/** An import, or NotFound. */
export async function getById(scope: Scope, id: string): Promise<Import> {
  const row = (await select(scope).where('import.id', id).first()) as Row | undefined
  if (!row) throw new NotFound('That import')
  return toImport(row)
}

/** Imports, newest first. */
export async function list(scope: Scope, limit: number): Promise<Import[]> {
  const rows = (await select(scope)
    .orderBy('import.created_at', 'desc')
    .orderBy('import.id', 'desc')
    .limit(limit)) as Row[]
  return rows.map(toImport)
}

export type NewImport = {
  id: string
  fileName: string
  fileKey: string
  fileSize: number
  fileSha256: string
  layout: ImportLayout
  startedBy: string | null
}

export async function insert(scope: WritingScope, made: NewImport): Promise<void> {
  await scope.db('imports').insert({
    organisation_id: scope.organisationId,
    id: made.id,
    file_name: made.fileName,
    file_key: made.fileKey,
    file_size: made.fileSize,
    file_sha256: made.fileSha256,
    state: 'uploaded',
    layout: JSON.stringify(made.layout),
    started_by: made.startedBy,
  })
}

/**
 * Moves an import on, but only from a state that the move is lawful from.
 * @returns whether it moved: false where somebody else moved it first
 */
export async function move(
  scope: Scope,
  id: string,
  from: readonly ImportState[],
  to: ImportState,
  change: {
    layout?: ImportLayout
    report?: unknown
    failure?: string | null
    rowsTotal?: number | null
    attempt?: number
  } = {},
): Promise<boolean> {
  const ended = to === 'done' || to === 'failed' || to === 'cancelled'
  const moved = await scope
    .db('imports')
    .where({ organisation_id: scope.organisationId, id })
    .whereIn('state', [...from])
    .update({
      state: to,
      finished_at: ended ? now() : null,
      ...(change.attempt !== undefined && { attempt: change.attempt }),
      ...(change.layout && { layout: JSON.stringify(change.layout) }),
      ...(change.report !== undefined && { report: JSON.stringify(change.report) }),
      ...(change.failure !== undefined && { failure: change.failure?.slice(0, 500) ?? null }),
      ...(change.rowsTotal !== undefined && { rows_total: change.rowsTotal }),
    })
  return moved === 1
}

/** The mapping that was last confirmed for the same headings. */
export async function findMapping(
  scope: Scope,
  headingsKey: string,
): Promise<ImportLayout['mapping'] | null> {
  const row = (await scope
    .db('import_mappings')
    .where({ organisation_id: scope.organisationId, headings_key: headingsKey })
    .first('mapping')) as { mapping: string } | undefined
  return row ? (JSON.parse(row.mapping) as ImportLayout['mapping']) : null
}

/** Keeps a mapping for the next file with the same headings. */
export async function saveMapping(
  scope: WritingScope,
  headingsKey: string,
  mapping: ImportLayout['mapping'],
): Promise<void> {
  await scope
    .db('import_mappings')
    .insert({
      organisation_id: scope.organisationId,
      headings_key: headingsKey,
      mapping: JSON.stringify(mapping),
      saved_at: now(),
    })
    .onConflict()
    .merge(['mapping', 'saved_at'])
}
