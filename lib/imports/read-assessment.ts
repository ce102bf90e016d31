import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

export type Assessment = 'satisfactory' | 'unsatisfactory'

const BAD =
  /\bun ?sat\w*|\bnot (?:sat\w*|passed|ok|compliant)\b|\bfail\w*\b|^[uf]$|\bunsafe\b|^no$|^n$|\bnon ?compliant\b/
const GOOD = /\bsat(?:is\w*)?\b|\bpass(?:ed)?\b|^[ps]$|^ok(?:ay)?$|^yes$|^y$|\bcompliant\b/

/**
 * The outcome that the report states, or null where it is not known. Words that say both leave it open, with a note.
 * @example readAssessment('UNSAT') // 'unsatisfactory'
 * @example readAssessment('Pass') // 'satisfactory'
 */
export function readAssessment(cell: Cell): Reading<Assessment | null> {
  if (isErrorCell(cell)) return wrong('formula error')
  const text = cellText(cell)
  if (saysUnknown(text) || foldWords(text) === 'none') return found(null)
  const words = foldWords(text)
  const bad = BAD.test(words)
  const good = GOOD.test(words.replaceAll(new RegExp(BAD, 'g'), ' '))
  if (bad !== good) return found(bad ? 'unsatisfactory' : 'satisfactory')
  return found(null, 'outcome not understood')
}
