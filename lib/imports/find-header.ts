import { type SheetRow } from './cell'
import { cellText, isBlank } from './cell-text'
import { foldWords } from './fold-words'
import { HEADING_RULES } from './heading-rules'
import { inspectionGuesses } from './inspection-headings'

/** Titles and notes above a list seldom take more rows than this. */
const MOST_ROWS = 60
/** A row of headings names at least two things that a stock list has. */
export const LEAST_HEADER_SCORE = 2

const RULES = Object.values(HEADING_RULES).flat()
const LINE = /^(?:\w+ )?(?:address|addr|add|line)(?: line)? ?[1-6]$/

/** How sure [0 to 1] the words are a heading that the importer knows. */
function headingLikeness(text: string): number {
  if (text.length > 60) return 0
  const words = foldWords(text)
  if (words === '' || /^\d+$/.test(words)) return 0
  if (LINE.test(words)) return 1
  const known = Math.max(0, ...RULES.filter(([pattern]) => pattern.test(words)).map(([, score]) => score))
  const inspection = Math.max(0, ...inspectionGuesses(text).map((guess) => guess.score))
  return Math.min(10, Math.max(known, inspection)) / 10
}

/** Headings are words, each a different one; a row with numbers or dates among them is a row of the list. */
function rowScore(row: SheetRow): number {
  const filled = row.cells.filter((cell) => !isBlank(cell))
  if (filled.length === 0) return 0
  const texts = filled.map((cell) => (typeof cell === 'string' ? cellText(cell) : ''))
  const wordless = texts.filter((text) => text === '' || /^[\d/.-]+$/.test(text)).length
  const known = texts.reduce((sum, text) => sum + headingLikeness(text), 0)
  return Math.max(0, known - wordless * 0.5)
}

/**
 * The row of headings: the one that names the most things a stock list has, below titles and blank rows.
 * @returns its number as the person sees it, and its score: below {@link LEAST_HEADER_SCORE} no row looks like headings
 * @example findHeader(rows) // { headerRow: 4, score: 23.1 }
 */
export function findHeader(rows: readonly SheetRow[]): { headerRow: number; score: number } {
  let best = { headerRow: rows[0]?.number ?? 1, score: 0 }
  for (const row of rows.slice(0, MOST_ROWS)) {
    const score = rowScore(row)
    if (score > best.score) best = { headerRow: row.number, score }
  }
  return best
}
