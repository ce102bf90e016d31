import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Cell, type SheetRow } from './cell'
import { cellText } from './cell-text'
import { contentFit, distinctShare } from './column-content'
import { foldWords } from './fold-words'
import { guessAddressLines } from './guess-address-lines'
import { guessInspectionColumns } from './guess-inspection-columns'
import { HEADING_RULES } from './heading-rules'
import { type ImportField, type Mapping } from './home-draft'
import { subjectOf } from './inspection-headings'

/** A column that may hold a field, and how likely [0 to about 11]. */
export type Candidate = { readonly field: ImportField; readonly column: number; readonly score: number }

/** Below this a guess is not worth making [our judgement]. */
const LEAST_SCORE = 3
/** The share of its cells that must fit before a column is taken for a field, whatever its heading says. */
const LEAST_FIT = 0.5

/** What a cell is can be told from its first letters [characters]. */
const LONGEST_TEXT = 200
const shortened = (cell: Cell): Cell => (typeof cell === 'string' ? cell.slice(0, LONGEST_TEXT) : cell)

/** Columns that tell what they are without a heading that is understood. */
const BY_CONTENT: readonly (readonly [ImportField, least: number, score: number])[] = [
  ['postcode', 0.8, 5],
  ['board-type', 0.8, 4.5],
  ['dwelling-type', 0.9, 3.5],
  ['tenure', 0.9, 3.5],
  ['address', 0.8, 3.2],
]

function headingScore(field: ImportField, heading: string): number {
  const rules = HEADING_RULES[field] ?? []
  return Math.max(0, ...rules.filter(([pattern]) => pattern.test(heading)).map(([, score]) => score))
}

/** Slips that only the two columns together or the spread of values can tell. */
function plausible(field: ImportField, heading: string, cells: readonly Cell[]): number {
  const distinct = distinctShare(cells)
  const many = cells.filter((cell) => cellText(cell) !== '').length >= 5
  if (field === 'reference' && many && distinct < 0.8) return 0
  if (field === 'number' && /^(?:property|prop|home|dwelling) /.test(heading) && many && distinct > 0.9)
    return 0
  if (field === 'patch' && !/patch/.test(heading) && cells.some((cell) => typeof cell === 'number')) return 0
  return 1
}

function scoreOf(field: ImportField, heading: string, cells: readonly Cell[], thisYear: number): number {
  const told = headingScore(field, heading)
  if (told === 0) return 0
  const fit = contentFit(field, cells, thisYear)
  if (fit === null) return told >= 7 ? told * 0.8 : 0
  if (fit < LEAST_FIT) return 0
  return told * (0.4 + 0.6 * fit) * plausible(field, heading, cells)
}

function byContent(
  heading: string,
  cells: readonly Cell[],
  column: number,
  thisYear: number,
): readonly Candidate[] {
  const telling = cells.filter((cell) => cellText(cell) !== '').length
  if (telling < 3 || subjectOf(heading) === 'other') return []
  return BY_CONTENT.flatMap(([field, least, score]) =>
    (contentFit(field, cells, thisYear) ?? 0) >= least ? [{ field, column, score }] : [],
  )
}

/** A landlord's own number is often called UPRN; it is taken for a reference where its cells are no such numbers. */
function asReference(
  headings: readonly string[],
  columns: readonly (readonly Cell[])[],
  thisYear: number,
): readonly Candidate[] {
  return headings.flatMap((heading, column): Candidate[] => {
    const cells = columns[column] ?? []
    const misnamed =
      headingScore('uprn', heading) > 0 && (contentFit('uprn', cells, thisYear) ?? 1) < LEAST_FIT
    return misnamed && distinctShare(cells) > 0.8 ? [{ field: 'reference', column, score: 6 }] : []
  })
}

/** The best candidates, each column and each field once. */
function settle(candidates: readonly Candidate[]): Mapping {
  const mapping: Mapping = {}
  const taken = new Set<number>()
  for (const { field, column, score } of [...candidates].sort(
    (one, other) => other.score - one.score || one.column - other.column,
  )) {
    if (score < LEAST_SCORE || taken.has(column) || mapping[field] !== undefined) continue
    mapping[field] = column
    taken.add(column)
  }
  return mapping
}

/** Half of a pair says nothing. */
function withoutHalves(mapping: Mapping): Mapping {
  const { easting, northing, latitude, longitude, ...rest } = mapping
  return {
    ...rest,
    ...(easting !== undefined && northing !== undefined ? { easting, northing } : {}),
    ...(latitude !== undefined && longitude !== undefined ? { latitude, longitude } : {}),
  }
}

/**
 * Which column holds which field, guessed from the headings and from a sample of the rows below them. A column is left
 * out rather than guessed wrongly.
 * @param today tells dates of past inspections from dates that are due; without it only the headings do
 * @example guessMapping(['Prop Ref', 'P’code', 'Fuse board'], rows) // { reference: 0, postcode: 1, 'board-type': 2 }
 */
export function guessMapping(
  headings: readonly Cell[],
  sampleRows: readonly SheetRow[],
  today?: CalendarDay,
): Mapping {
  const thisYear = Number(today?.slice(0, 4) ?? 2100)
  const width = Math.max(headings.length, ...sampleRows.map((row) => row.cells.length))
  const texts = Array.from({ length: width }, (_, column) =>
    cellText(headings[column]).slice(0, LONGEST_TEXT),
  )
  const folded = texts.map(foldWords)
  const columns = texts.map((_, column) => sampleRows.map((row) => shortened(row.cells[column] ?? null)))
  const fields = Object.keys(HEADING_RULES) as ImportField[]
  const candidates = folded.flatMap((heading, column): Candidate[] => {
    const cells = columns[column] ?? []
    const told = fields.map((field) => ({ field, column, score: scoreOf(field, heading, cells, thisYear) }))
    return [...told.filter(({ score }) => score > 0), ...byContent(heading, cells, column, thisYear)]
  })
  return withoutHalves(
    settle([
      ...candidates,
      ...asReference(folded, columns, thisYear),
      ...guessInspectionColumns(texts, columns, today),
      ...guessAddressLines(folded, columns),
    ]),
  )
}
