/** Rows that are no homes: blank, a total, the headings once more, a section's name or a remark. */
import { type Cell, type SheetRow } from './cell'
import { cellText } from './cell-text'
import { foldWords } from './fold-words'
import { type ImportField, type Mapping } from './home-draft'

const TOTAL =
  /^(?:grand |sub ?|overall |running )?(?:totals?|sum|count|average|avg)(?: (?:number of|no of|of))?(?: (?:all|homes?|units?|propert(?:y|ies)|dwellings?|stock|rows?|addresses|records?))*(?: \d[\d ]*)?$/
const REMARK =
  /^(?:end of|exported|printed|produced|report (?:run|date)|source|notes?\b|page \d|figures|key\b|nb\b|prepared)/
const PLACES: readonly ImportField[] = ['number', 'street', 'address', 'postcode']

/** A list of fewer columns than this may well have rows of a single cell. */
const FEW_COLUMNS = 4

const FIGURES = /^[\d.,%\s]+$/
/** No total is told in more letters than this; longer text need not be looked at. */
const LONGEST_TOTAL = 60
const isTotal = (text: string) => text.length <= LONGEST_TOTAL && TOTAL.test(foldWords(text))

/** Tells why a row is no home, or null where it is one. */
export type RowKind = (row: SheetRow) => string | null

/**
 * Tells rows that are no homes from those that are, for one list.
 * @example rowKindOf({ reference: 0, uprn: 1 }, headings)({ number: 9, cells: ['TOTAL', 640] }) // 'a total'
 */
export function rowKindOf(mapping: Mapping, headings: readonly Cell[]): RowKind {
  const width = Object.keys(mapping).length
  const heads = headings.map((heading) => cellText(heading).toLowerCase())
  return (row) => {
    let filled = 0
    let again = 0
    let only: Cell = null
    let hasWords = false
    let saysTotal = false
    row.cells.forEach((cell, column) => {
      const text = cellText(cell)
      if (text === '') return
      filled += 1
      only = cell
      if (text.length === heads[column]?.length && text.toLowerCase() === heads[column]) again += 1
      hasWords ||= typeof cell !== 'number' && !FIGURES.test(text)
      // A total says so in one of its first cells.
      if (filled <= 3) saysTotal ||= isTotal(text)
    })
    if (filled === 0) return 'blank'
    const textOf = (field: ImportField) => cellText(row.cells[mapping[field] ?? -1])
    const places = PLACES.map(textOf).filter((text) => text !== '')
    if (saysTotal && textOf('postcode') === '' && places.every(isTotal)) return 'a total'
    if (again >= 2 && again >= filled * 0.6) return 'the headings once more'
    if (filled === 1 && width >= FEW_COLUMNS) {
      if (places.length === 0) return typeof only === 'string' ? 'a remark' : 'a total'
      if (REMARK.test(foldWords(cellText(only)))) return 'a remark'
    }
    if (places.length > 0 || hasWords) return null
    return textOf('uprn').length >= 8 || textOf('reference') !== '' ? null : 'a total'
  }
}
