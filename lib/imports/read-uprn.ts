import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

/** A number of ten digits or more that ends in so many zeros was rounded on its way [our judgement]. */
const ROUNDED = /^\d{4,}0{6,}$/

/**
 * A unique property reference number: up to 12 digits, kept without the zeros that pad it, or null where there is none.
 * @source BS 7666-2: an integer of at most 12 digits, without meaning in its digits
 * @example readUprn('000012345678') // '12345678'
 * @example readUprn('1.00099E+11') // why: 'UPRN lost its digits'
 */
export function readUprn(cell: Cell): Reading<string | null> {
  if (isErrorCell(cell)) return wrong('formula error')
  const text = cellText(cell)
  if (saysUnknown(text) || /^(?:none|0+)$/i.test(text)) return found(null)
  const compact = text.replaceAll(/[\s,]/g, '').replace(/\.0+$/, '')
  if (/^\d+(?:\.\d+)?e\+?\d+$/i.test(compact)) return wrong('UPRN lost its digits')
  if (!/^\d+$/.test(compact)) return wrong('not a UPRN')
  const digits = compact.replace(/^0+/, '')
  if (digits.length > 12) return wrong('not a UPRN')
  if (digits.length >= 10 && ROUNDED.test(digits)) return wrong('UPRN lost its digits')
  return found(digits)
}
