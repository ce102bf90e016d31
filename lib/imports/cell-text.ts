/** A cell as text, the same for a workbook and for separated text. */
import { type Cell, type DateSerial } from './cell'

/** An apostrophe that an export put before text which begins like a formula; it is not part of the text. */
const NEUTRALISED = /^'(?=[=+\-@\t\r])/
/** Text that is on one line already, as nearly every cell is. */
const TIDY = /^[!-&(-~](?: ?[!-~])*$/
/** Signs that take no room on the page, and would make two like texts differ. */
const UNSEEN = /[\u200B-\u200D\u2060\uFEFF\u00AD]/g

export const isDateSerial = (cell: Cell): cell is DateSerial =>
  typeof cell === 'object' && cell !== null && 'serial' in cell

export const isErrorCell = (cell: Cell): cell is { readonly error: string } =>
  typeof cell === 'object' && cell !== null && 'error' in cell

/**
 * The text of a cell on one line, without the spaces around it; empty where it holds nothing.
 * @example cellText('  4  Lantern\u00A0Lane ') // '4 Lantern Lane'
 * @example cellText(true) // 'yes'
 */
export function cellText(cell: Cell | undefined): string {
  if (cell === null || cell === undefined) return ''
  if (typeof cell === 'string')
    return TIDY.test(cell)
      ? cell
      : cell.replaceAll(UNSEEN, '').replaceAll(/\s+/g, ' ').trim().replace(NEUTRALISED, '')
  if (typeof cell === 'number') return String(cell)
  if (typeof cell === 'boolean') return cell ? 'yes' : 'no'
  return 'error' in cell ? cell.error : `day ${cell.serial}`
}

/** Whether a cell holds nothing that a person would see. */
export const isBlank = (cell: Cell | undefined): boolean => cellText(cell) === ''
