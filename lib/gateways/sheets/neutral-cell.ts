/** What a spreadsheet program would take for a formula, or for the start of a cell of its own. */
const DANGEROUS = /^[=+\-@\t\r\n\uFF1D\uFF0B\uFF0D\uFF20]/

export type OutCell = string | number | null

/**
 * A cell that no spreadsheet program runs: text that begins like a formula gets an apostrophe before it; numbers stay.
 * @source CWE-1236 improper neutralisation of formula elements in a CSV file
 * @example neutralCell('=1+1') // "'=1+1"
 * @example neutralCell(-5) // -5
 */
export const neutralCell = (cell: OutCell): OutCell =>
  typeof cell === 'string' && DANGEROUS.test(cell) ? `'${cell}` : cell
