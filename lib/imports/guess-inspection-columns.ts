/** The columns of the last inspection, its outcome and the next due date: the ones most easily taken for another's. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Cell } from './cell'
import { cellText } from './cell-text'
import { contentFit, futureShare } from './column-content'
import { foldWords } from './fold-words'
import { type Candidate } from './guess-mapping'
import { type InspectionGuess, inspectionGuesses, type Subject, subjectOf } from './inspection-headings'

/** Half of a column's dates may lie ahead before it cannot be one of past inspections [our judgement]. */
const MOST_FUTURE = 0.5
const OUTCOME_WORD = /\b(?:un)?sat\w*|\bpass|\bfail/

/**
 * What a heading without a subject of its own ("Next due") belongs to: the subject of the columns just before it,
 * if they hold dates or certificates. A column about something else in between ends the search.
 */
function subjectBefore(
  at: number,
  headings: readonly string[],
  isDated: (column: number) => boolean,
): Subject {
  for (let column = at - 1; column >= 0; column--) {
    const heading = headings[column] ?? ''
    const subject = subjectOf(heading)
    if (subject === 'electrical') return subject
    if (subject === 'other')
      return isDated(column) || /\b(?:cert|due|expiry|test|check|date|inspection|service)/i.test(heading)
        ? subject
        : null
    if (inspectionGuesses(heading).length === 0) return null
  }
  return null
}

function contentScore(
  guess: InspectionGuess,
  cells: readonly Cell[],
  today: CalendarDay | undefined,
): number {
  const fit = contentFit(guess.field, cells, Number(today?.slice(0, 4) ?? 2100))
  const isBare = !guess.generic && guess.score < 10
  if (fit === null) return isBare || guess.score < 6 ? 0 : 0.8
  if (fit < 0.5) return 0
  if (guess.field === 'assessment') {
    const worded = cells.filter((cell) => OUTCOME_WORD.test(foldWords(cellText(cell)))).length
    return isBare && worded === 0 ? 0 : fit
  }
  const future = today === undefined ? null : futureShare(cells, today)
  if (guess.field === 'last-inspection' && future !== null && future > MOST_FUTURE) return 0
  // A bare "EICR" whose dates have all gone by is the inspection, not the next one.
  if (guess.field === 'next-due' && isBare && (future ?? 0) <= MOST_FUTURE) return 0
  return fit
}

/**
 * The candidates for the three inspection fields. Where two columns are equally good for one field, neither is taken:
 * a gas date read as an electrical one would be worse than none.
 */
export function guessInspectionColumns(
  headings: readonly string[],
  columns: readonly (readonly Cell[])[],
  today: CalendarDay | undefined,
): readonly Candidate[] {
  const isDated = (column: number) => (contentFit('last-inspection', columns[column] ?? [], 2100) ?? 0) >= 0.5
  const candidates = headings.flatMap((heading, column): Candidate[] => {
    return inspectionGuesses(heading).flatMap((guess) => {
      const subject = guess.generic ? subjectBefore(column, headings, isDated) : 'electrical'
      // A heading as thin as "Date" counts only beside an electrical one.
      if (subject === 'other' || (guess.score < 5 && subject !== 'electrical')) return []
      const score =
        (guess.score + (guess.generic && subject === 'electrical' ? 1 : 0)) *
        contentScore(guess, columns[column] ?? [], today)
      return score > 0 ? [{ field: guess.field, column, score }] : []
    })
  })
  return candidates.filter((one) => {
    const rivals = candidates.filter((other) => other.field === one.field && other.column !== one.column)
    return rivals.every(
      (other) => Math.abs(other.score - one.score) > 0.5 || isCopy(columns, one.column, other.column),
    )
  })
}

/** Two columns that say the same in every row are no rivals. */
const isCopy = (columns: readonly (readonly Cell[])[], one: number, other: number) =>
  (columns[one] ?? []).every((cell, row) => cellText(cell) === cellText(columns[other]?.[row]))
