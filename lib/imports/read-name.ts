import { type Cell } from './cell'
import { cellText, isDateSerial, isErrorCell } from './cell-text'
import { saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

/**
 * A short text such as a reference, a house number or a patch's name, or null where there is none. A spreadsheet
 * program turns "3-4" into the third of April: what was typed is lost, so the row cannot be taken.
 * @param what names it in the refusal: "reference"
 * @param longest [characters]
 * @example readName('North Quay', 'patch', 120) // 'North Quay'
 */
export function readName(cell: Cell, what: string, longest: number): Reading<string | null> {
  if (isErrorCell(cell)) return wrong('formula error')
  if (isDateSerial(cell)) return wrong(`${what} turned into a date`)
  const text = cellText(cell)
  if (saysUnknown(text)) return found(null)
  return text.length > longest ? wrong(`${what} too long`) : found(text)
}
