import { type WritingScope } from '@/db/connection'
import * as problems from '@/db/repositories/import-problems'
import { type HomeIdentity } from '@/lib/imports/known-home'
import { type SheetRow } from '@/lib/imports/cell'
import { type Mapping, type RowProblem } from '@/lib/imports/home-draft'

type Waiting = problems.KeptProblem & { readonly sequence: number }

/** Columns of the identity that have another name as a column of a file. */
const FIELD_OF: Partial<Record<keyof HomeIdentity, string>> = { addressKey: 'address' }

/** Collects what is wrong with the rows of a file, and writes it in batches. */
export function createProblemLog(
  importId: string,
  layout: { headings: readonly string[]; mapping: Mapping },
) {
  let waiting: Waiting[] = []
  const sequences = new Map<number, number>()

  function add(row: number, one: Omit<problems.KeptProblem, 'row' | 'heading'>): void {
    const sequence = (sequences.get(row) ?? 0) + 1
    sequences.set(row, sequence)
    const column = one.field === null ? undefined : (layout.mapping as Record<string, number>)[one.field]
    waiting.push({
      ...one,
      row,
      sequence,
      heading: column === undefined ? null : (layout.headings[column] ?? null),
    })
  }

  return {
    /** Adds the problems of one row; a rejected row is kept whole, to hand back. */
    addRow(row: SheetRow, found: readonly RowProblem[]): void {
      found.forEach((problem, index) =>
        add(row.number, {
          severity: problem.severity,
          field: problem.field,
          why: problem.why,
          cell: problem.cell,
          rawRow: problem.severity === 'rejected' && index === 0 ? row.cells : null,
        }),
      )
    },
    /** Adds a row that reads well and still cannot be taken. */
    addClash(row: number, why: string, cells: SheetRow['cells']): void {
      add(row, { severity: 'rejected', field: null, why, cell: null, rawRow: cells })
    },
    /** Adds a change of a home that was known already. */
    addChange(row: number, change: { field: keyof HomeIdentity; from: string; to: string }): void {
      if (change.field === 'addressKey') return
      const field = FIELD_OF[change.field] ?? change.field
      add(row, {
        severity: 'noted',
        field,
        why: `${field} was ${change.from}`,
        cell: change.to,
        rawRow: null,
      })
    },
    /** Writes what is waiting. A transaction that is begun again must begin with a new log. */
    async write(scope: WritingScope): Promise<void> {
      const batch = waiting
      waiting = []
      await problems.insert(scope, importId, batch)
    },
  }
}
