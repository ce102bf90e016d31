/** A mapping kept as a file: a JSON object of field to heading, or to the letter of a column. */
import { type FieldProblem, Invalid } from '@/lib/errors/expected'
import { type Cell } from './cell'
import { cellText } from './cell-text'
import { columnLetter, columnOfLetter } from './column-letter'
import { foldWords } from './fold-words'
import { IMPORT_FIELDS, type ImportField, type Mapping } from './home-draft'

const isField = (text: string): text is ImportField => (IMPORT_FIELDS as readonly string[]).includes(text)

/** The column that a heading or a letter names, or what is wrong with it. A heading counts before a letter. */
function columnNamed(name: string, headings: readonly Cell[]): number | string {
  const same = headings.flatMap((heading, column) =>
    cellText(heading) !== '' && foldWords(cellText(heading)) === foldWords(name) ? [column] : [],
  )
  const [column, another] = same
  if (column !== undefined && another === undefined) return column
  if (column !== undefined && another !== undefined)
    return `the heading "${name}" stands over columns ${same.map(columnLetter).join(' and ')}: give the letter`
  const byLetter = columnOfLetter(name.trim())
  if (byLetter === null) return `there is no heading "${name}"`
  return byLetter < headings.length ? byLetter : `there is no column ${name}`
}

/**
 * The mapping that a file holds, for the headings of a list.
 * @param json the parsed file
 * @throws Invalid with one problem for each entry that is wrong
 * @example mappingFromFile({ postcode: 'P’code', note: 'Y' }, headings) // { postcode: 6, note: 24 }
 */
export function mappingFromFile(json: unknown, headings: readonly Cell[]): Mapping {
  if (typeof json !== 'object' || json === null || Array.isArray(json))
    throw new Invalid([{ field: 'mapping', problem: 'A mapping is a JSON object of field to heading.' }])
  const mapping: Mapping = {}
  const problems: FieldProblem[] = []
  const takenBy = new Map<number, string>()
  for (const [field, name] of Object.entries(json)) {
    const refuse = (problem: string) => problems.push({ field, problem: `${field}: ${problem}.` })
    if (!isField(field)) refuse(`there is no such field; the fields are ${IMPORT_FIELDS.join(', ')}`)
    else if (name === null || name === '') continue
    else if (typeof name !== 'string') refuse('give a heading or the letter of a column')
    else {
      const column = columnNamed(name, headings)
      const other = typeof column === 'number' ? takenBy.get(column) : undefined
      if (typeof column === 'string') refuse(column)
      else if (other !== undefined) refuse(`column ${columnLetter(column)} is taken by ${other} already`)
      else {
        mapping[field] = column
        takenBy.set(column, field)
      }
    }
  }
  if (problems.length > 0) throw new Invalid(problems)
  return mapping
}

/**
 * The file of a mapping: headings where they are told apart, letters where they are not.
 * @example mappingToFile({ postcode: 6 }, headings) // { postcode: 'P’code' }
 */
export function mappingToFile(
  mapping: Mapping,
  headings: readonly Cell[],
): Partial<Record<ImportField, string>> {
  const entries = Object.entries(mapping).map(([field, column]) => {
    const heading = cellText(headings[column])
    return [
      field,
      heading !== '' && columnNamed(heading, headings) === column ? heading : columnLetter(column),
    ]
  })
  return Object.fromEntries(entries) as Partial<Record<ImportField, string>>
}
