import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

/** No dwelling of one household has more [our judgement]. */
const MOST = 30

/**
 * The bedrooms of a home, or null where the cell does not say; a studio or bedsit has none.
 * @example readBedrooms('3 bed') // 3
 * @example readBedrooms('2B4P') // 2
 */
export function readBedrooms(cell: Cell): Reading<number | null> {
  if (isErrorCell(cell)) return wrong('formula error')
  const words = foldWords(cellText(cell))
  if (/^(?:studio|bed ?sit)/.test(words)) return found(0)
  if (words === 'none' || saysUnknown(words)) return found(null)
  const count = /^(\d{1,2})(?: 0+)?(?: ?b(?:ed)?(?:room)?s?(?: ?\d+ ?p(?:erson)?s?)?)?$/.exec(words)?.[1]
  return count !== undefined && Number(count) <= MOST ? found(Number(count)) : wrong('not a number')
}
