import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

/** @source BS 7666-0 as published with the government's data standards catalogue: the shapes and letters of a postcode */
const SHAPE =
  /^(?:GIR0AA|(?:[A-PR-UWYZ](?:\d{1,2}|\d[A-HJKPS-UW]|[A-HK-Y]\d{1,2}|[A-HK-Y]\d[ABEHMNPRV-Y]))\d[ABD-HJLNP-UW-Z]{2})$/

/**
 * A postcode in capitals with its space, or null where there is none. A letter O for a nought, or an I for a one, is
 * refused rather than mended: the mended one could be somebody else's street.
 * @example readPostcode('zx15bb') // 'ZX1 5BB'
 * @example readPostcode('ZXI 1AA') // why: 'postcode'
 */
export function readPostcode(cell: Cell): Reading<string | null> {
  if (isErrorCell(cell)) return wrong('formula error')
  const text = cellText(cell)
  if (saysUnknown(text) || /^none$/i.test(text)) return found(null)
  const compact = text.toUpperCase().replaceAll(/[\s.\-]/g, '')
  return SHAPE.test(compact) ? found(`${compact.slice(0, -3)} ${compact.slice(-3)}`) : wrong('postcode')
}

/**
 * The postcode at the end of an address, and the address without it.
 * @example postcodeAtEnd('9 Fore Street, Quillhaven, zx1 5bb') // { rest: '9 Fore Street, Quillhaven', postcode: 'ZX1 5BB' }
 */
export function postcodeAtEnd(address: string): { rest: string; postcode: string | null } {
  const match = /^(.*?)[\s,.]+([a-z]{1,2}\d[a-z\d]?\s?\d[a-z]{2})[\s,.]*$/i.exec(address)
  const reading = match ? readPostcode(match[2] ?? '') : null
  return match && reading?.ok
    ? { rest: match[1] ?? '', postcode: reading.value }
    : { rest: address, postcode: null }
}
