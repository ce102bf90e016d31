/** What an import found wrong, or worth knowing, row by row; kept with the import. */
import { type Cell } from '@/lib/imports/cell'
import { type RowProblem } from '@/lib/imports/home-draft'
import { type Scope, type WritingScope } from '@/db/connection'
import { insertRows } from './insert-rows'

export type KeptProblem = {
  readonly row: number
  readonly severity: RowProblem['severity']
  readonly field: string | null
  readonly heading: string | null
  readonly why: string
  readonly cell: string | null
  /** the whole row, on the first problem of a rejected one */
  readonly rawRow: readonly Cell[] | null
}

type Row = {
  row_number: number
  severity: RowProblem['severity']
  field: string | null
  heading: string | null
  problem: string
  cell: string | null
  raw_row: string | null
}

const toProblem = (row: Row): KeptProblem => ({
  row: row.row_number,
  severity: row.severity,
  field: row.field,
  heading: row.heading,
  why: row.problem,
  cell: row.cell,
  rawRow: row.raw_row === null ? null : (JSON.parse(row.raw_row) as Cell[]),
})

/** Forgets an import's problems, before it is checked anew. */
export async function clear(scope: WritingScope, importId: string): Promise<void> {
  await scope
    .db('import_problems')
    .where({ organisation_id: scope.organisationId, import_id: importId })
    .delete()
}

/** Adds problems; `sequence` numbers those of one row. */
export async function insert(
  scope: WritingScope,
  importId: string,
  problems: readonly (KeptProblem & { readonly sequence: number })[],
): Promise<void> {
  await insertRows(
    scope.db,
    'import_problems',
    [
      'organisation_id',
      'import_id',
      'row_number',
      'sequence',
      'severity',
      'field',
      'heading',
      'problem',
      'cell',
      'raw_row',
    ],
    problems.map((one) => [
      scope.organisationId,
      importId,
      one.row,
      one.sequence,
      one.severity,
      one.field,
      one.heading?.slice(0, 120) ?? null,
      one.why.slice(0, 300),
      one.cell?.slice(0, 300) ?? null,
      one.rawRow === null ? null : JSON.stringify(one.rawRow),
    ]),
  )
}

/** A page of problems in row order, after a row. */
export async function list(
  scope: Scope,
  importId: string,
  severity: RowProblem['severity'],
  { after, limit }: { after: { row: number; sequence: number } | null; limit: number },
): Promise<(KeptProblem & { sequence: number })[]> {
  const query = scope
    .db('import_problems')
    .where({ organisation_id: scope.organisationId, import_id: importId, severity })
    .orderBy(['row_number', 'sequence'])
    .limit(limit)
  if (after)
    query.andWhere((later) =>
      later
        .where('row_number', '>', after.row)
        .orWhere((same) => same.where('row_number', after.row).andWhere('sequence', '>', after.sequence)),
    )
  return ((await query) as (Row & { sequence: number })[]).map((row) => ({
    ...toProblem(row),
    sequence: row.sequence,
  }))
}
