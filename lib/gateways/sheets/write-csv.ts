import { type Writable } from 'node:stream'
import { pipeline } from 'node:stream/promises'
import { stringify } from 'csv-stringify'
import { neutralCell, type OutCell } from './neutral-cell'

async function* neutral(headings: readonly string[], rows: AsyncIterable<readonly OutCell[]>) {
  yield headings.map(neutralCell)
  for await (const row of rows) yield row.map(neutralCell)
}

/**
 * Writes a table as comma-separated UTF-8 with a byte-order mark, so that spreadsheet programs read its letters rightly.
 * Text that begins like a formula is made harmless; the output is ended.
 * @example await writeCsv(['Address', 'C2'], rows, createWriteStream('homes.csv'))
 */
export async function writeCsv(
  headings: readonly string[],
  rows: AsyncIterable<readonly OutCell[]>,
  output: Writable,
): Promise<void> {
  await pipeline(neutral(headings, rows), stringify({ bom: true, record_delimiter: 'windows' }), output)
}
