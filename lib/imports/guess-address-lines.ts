/** "Address line 1", "Add 2" and their like: what each of the numbered lines holds, told from its cells. */
import { type Cell } from './cell'
import { cellText } from './cell-text'
import { distinctShare } from './column-content'
import { type ImportField } from './home-draft'

const LINE =
  /^(?:(?:property|prop|postal|home|site|full) )?(?:address|addr|add|adr|line|address line|addr line|add line) ?(?:line )?([1-6])$/
const STREET =
  /\b(?:road|rd|street|st|avenue|ave|lane|ln|close|court|drive|gardens|crescent|terrace|place|row|way|walk|grove|heol|ffordd|stryd)\b/i
const HOUSE_NUMBER = /^(?:(?:flat|apt|apartment|unit|no\.?)\s*)?\d{0,4}\s?[a-z]?$/i

/** A line that many homes share and that names no street is a town or a county. */
function isTown(cells: readonly Cell[]): boolean {
  const texts = cells.map(cellText).filter(Boolean)
  const streets = texts.filter((text) => STREET.test(text) || /\d/.test(text)).length
  return texts.length > 0 && streets / texts.length < 0.2 && (texts.length < 5 || distinctShare(cells) < 0.4)
}

/** The endings and names of counties, which follow the town. Common knowledge of the United Kingdom's old counties. */
const COUNTY =
  /(?:shire|sex)$|^(?:county|co)\b|\bcounty$|^(?:kent|surrey|norfolk|suffolk|devon|dorset|cornwall|cumbria|durham|somerset|merseyside|gwynedd|powys|gwent|clwyd|dyfed|fife|rutland|northumberland)$/i

const share = (cells: readonly Cell[], pattern: RegExp) => {
  const texts = cells.map(cellText).filter(Boolean)
  return texts.length === 0 ? 0 : texts.filter((text) => pattern.test(text)).length / texts.length
}

type Line = { readonly field: ImportField; readonly column: number; readonly score: number }

/**
 * Candidates for the numbered lines of an address: the first is the address, or the house number where the second is
 * the street; the last line that holds a town and no county is the town; the rest are left out.
 */
export function guessAddressLines(
  headings: readonly string[],
  columns: readonly (readonly Cell[])[],
): readonly Line[] {
  const lines = headings
    .flatMap((heading, column) => {
      const line = LINE.exec(heading)?.[1]
      return line === undefined ? [] : [{ line: Number(line), column, cells: columns[column] ?? [] }]
    })
    .sort((one, other) => one.line - other.line)
  const [first, ...others] = lines
  if (!first) return []
  const onlyNumbers = share(first.cells, HOUSE_NUMBER) > 0.7
  const guesses: Line[] = [{ field: onlyNumbers ? 'number' : 'address', column: first.column, score: 9 }]
  const town = others.findLast((line) => isTown(line.cells) && share(line.cells, COUNTY) < 0.5)
  if (town) guesses.push({ field: 'town', column: town.column, score: 6 })
  const street = others.find((line) => line !== town && line.cells.some((cell) => cellText(cell) !== ''))
  if (street && (!town || street.line < town.line))
    guesses.push({ field: onlyNumbers ? 'address' : 'street', column: street.column, score: 6 })
  return guesses
}
