/** How a file is to be read: which sheet, which header row, which column is what. */
import { type FieldProblem } from '@/lib/errors/expected'
import { type Cell } from './cell'
import { type ImportField, type Mapping } from './home-draft'
import { IMPORT_FIELD_NAMES } from './import-field-names'

export type ImportLayout = {
  /** what the file is, in words: "Excel workbook", "text, separated by semicolons, Windows-1252" */
  readonly fileKind: string
  readonly sheets: readonly { readonly name: string; readonly index: number }[]
  readonly sheet: number
  /** the row that holds the headings, as the person sees it [1 upwards] */
  readonly headerRow: number
  readonly headings: readonly string[]
  /** the first rows under the headings, to help to choose */
  readonly sample: readonly (readonly string[])[]
  readonly mapping: Mapping
}

/**
 * The mapping that a choice for each column makes, and what is wrong with it: a field can be only one column, and
 * without an address there is no home.
 * @param columns for each column in order, its field, or '' where it is left out
 * @example mappingOfColumns(['uprn', '', 'address']).mapping // { uprn: 0, address: 2 }
 */
export function mappingOfColumns(columns: readonly (ImportField | '')[]): {
  mapping: Mapping
  problems: FieldProblem[]
} {
  const mapping: Mapping = {}
  const problems: FieldProblem[] = []
  columns.forEach((field, column) => {
    if (field === '') return
    if (mapping[field] === undefined) mapping[field] = column
    else
      problems.push({
        field: `column-${column}`,
        problem: `Two columns are chosen as ${IMPORT_FIELD_NAMES[field]}. Choose one, and leave the other out.`,
      })
  })
  if (mapping.address === undefined && mapping.street === undefined)
    problems.push({ field: 'column-0', problem: 'Say which column holds the address, or the street.' })
  return { mapping, problems }
}

/** A cell as plain text, to show to a person. */
export function cellText(cell: Cell | undefined): string {
  if (cell === null || cell === undefined) return ''
  if (typeof cell !== 'object') return String(cell)
  if ('error' in cell) return cell.error
  const start = cell.epoch === 1904 ? Date.UTC(1904, 0, 1) : Date.UTC(1899, 11, 30)
  return new Date(start + Math.floor(cell.serial) * 86_400_000).toISOString().slice(0, 10)
}
