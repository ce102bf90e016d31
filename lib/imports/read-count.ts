import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

/** No report holds more of one code than this [our judgement]. */
const MOST = 200

/**
 * How many observations of one code stand open: a whole number, or null where the cell does not say.
 * A dash and "none" say that there are none; a blank says nothing.
 * @example readCount('nil') // 0
 * @example readCount('two') // why: 'not a number'
 */
export function readCount(cell: Cell): Reading<number | null> {
  if (isErrorCell(cell)) return wrong('formula error')
  const text = cellText(cell)
  if (/^[-–—]+$/.test(text) || /^(?:nil|none|no|n|zero)$/.test(foldWords(text))) return found(0)
  if (saysUnknown(text)) return found(null)
  if (!/^\d{1,6}(?:\.0+)?$/.test(text) || Number(text) > MOST) return wrong('not a number')
  return found(Number(text))
}
