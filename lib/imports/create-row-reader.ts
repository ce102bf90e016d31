import { type Cell, type SheetRow } from './cell'
import { type Mapping } from './home-draft'
import { HomeKeys } from './home-keys'
import { type DraftContext, readDraft } from './read-draft'
import { RowCells } from './row-cells'
import { rowKindOf } from './row-kind'
import { type RowOutcome } from './row-outcome'

export type RowReader = { read(row: SheetRow): RowOutcome }

/**
 * Reads the rows below the header, one after another. A row with one bad field is rejected whole; every problem of it
 * is told. The reader remembers only the keys of the homes it accepted.
 * @example
 * const reader = createRowReader({ mapping, headings, today, nation: 'england' })
 * reader.read({ number: 5, cells: ['QH-1001', 'BS3036'] }) // { kind: 'accepted', draft, problems: [] }
 */
export function createRowReader(
  options: DraftContext & { mapping: Mapping; headings: readonly Cell[] },
): RowReader {
  const { mapping, headings } = options
  const keys = new HomeKeys()
  const rowKind = rowKindOf(mapping, headings)
  return {
    read(row) {
      const why = rowKind(row)
      if (why === 'blank') return { kind: 'blank', row: row.number }
      if (why !== null) return { kind: 'total', row: row.number, why }
      const cells = new RowCells(row, mapping)
      const draft = readDraft(row.number, cells, options)
      if (!cells.isRejected) {
        const clash = keys.clash(draft)
        if (clash !== null) cells.problem(null, 'rejected', clash)
      }
      if (cells.isRejected) return { kind: 'rejected', row: row.number, problems: cells.problems }
      keys.add(draft)
      return { kind: 'accepted', row: row.number, draft, problems: cells.problems }
    },
  }
}
