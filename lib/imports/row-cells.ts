/** One row seen through the mapping: the cell of a field, and the problems met while reading them. */
import { type Cell, type SheetRow } from './cell'
import { cellText } from './cell-text'
import { type ImportField, type Mapping, type RowProblem } from './home-draft'
import { type Reading } from './reading'

/** No field but a note holds more text than this; readers are spared what is no field at all [characters]. */
const LONGEST_TEXT = 1000

export class RowCells {
  readonly problems: RowProblem[] = []
  private readonly tooLong = new Set<ImportField>()

  constructor(
    private readonly row: SheetRow,
    readonly mapping: Mapping,
  ) {}

  /** The cell of a field; null where the list has no column for it. */
  cell(field: ImportField): Cell {
    const column = this.mapping[field]
    const cell = column === undefined ? null : (this.row.cells[column] ?? null)
    if (typeof cell !== 'string' || cell.length <= LONGEST_TEXT || field === 'note') return cell
    if (!this.tooLong.has(field)) {
      this.tooLong.add(field)
      this.problems.push({
        row: this.row.number,
        field,
        severity: 'rejected',
        why: 'text too long',
        cell: cell.slice(0, 200),
      })
    }
    return null
  }

  /** The text of a field on one line. */
  text(field: ImportField): string {
    return cellText(this.cell(field))
  }

  /**
   * The value of a reading, with its note or its problem put on record; `otherwise` stands in where it is wrong, and
   * goes no further since the row is then rejected.
   */
  take<T>(field: ImportField, reading: Reading<T>, otherwise: T): T {
    if (!reading.ok) {
      this.problem(field, 'rejected', reading.why)
      return otherwise
    }
    if (reading.note !== null) this.problem(field, 'noted', reading.note)
    return reading.value
  }

  problem(field: ImportField | null, severity: RowProblem['severity'], why: string): void {
    const cell = field === null ? '' : this.text(field)
    this.problems.push({
      row: this.row.number,
      field,
      severity,
      why,
      cell: cell === '' ? null : cell.slice(0, 200),
    })
  }

  get isRejected(): boolean {
    return this.problems.some((problem) => problem.severity === 'rejected')
  }
}
