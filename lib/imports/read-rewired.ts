import { type Cell } from './cell'
import { cellText } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { readYearBuilt } from './read-year-built'
import { found, type Reading, wrong } from './reading'

/** No home was wired before electric light [our judgement]. */
const FIRST_YEAR = 1880
const NO = /^(?:no|n|none|never|nil|not rewired|original|0)$/

/**
 * The year in which a home was rewired; null where it was not, or where the year is not known.
 * @example readRewired('full rewire 2015', 2026) // 2015
 * @example readRewired('Y', 2026) // null with the note 'rewired, year not given'
 */
export function readRewired(cell: Cell, thisYear: number): Reading<number | null> {
  const text = cellText(cell)
  if (saysUnknown(text) || NO.test(foldWords(text))) return found(null)
  const bare = /\b(?:part|partial|partly)\b/i.test(text)
    ? ''
    : text.replace(/^(?:full(?:y)?\s+)?re-?wired?\s+(?:in\s+)?/i, '')
  if (bare === '') return found(null, 'rewired in part, not counted')
  const reading = readYearBuilt(typeof cell === 'string' ? bare : cell, thisYear)
  if (!reading.ok) return reading
  const { from, to, about } = reading.value
  if (from !== null && from < FIRST_YEAR) return wrong('not a year')
  if (from === null || to === null) return found(null, 'rewired, year not given')
  if (from === to) return found(from)
  return about && to - from <= 10
    ? found(Math.round((from + to) / 2), 'rewired about then')
    : found(null, 'rewired, year not exact')
}
