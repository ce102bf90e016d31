import { once } from 'node:events'
import { type Writable } from 'node:stream'
import { setImmediate } from 'node:timers/promises'
import ExcelJs from 'exceljs'
import { neutralCell, type OutCell } from './neutral-cell'

/** The writer packs in the background; it gets a turn after this many rows, so that rows do not pile up in memory. */
const TURN = 500

/**
 * Writes a table as a workbook of one sheet with its heading row kept in view. Text that begins like a formula is made
 * harmless, numbers stay numbers; the output is ended.
 * @example await writeXlsx(['Address', 'C2'], rows, createWriteStream('homes.xlsx'), 'Homes')
 */
export async function writeXlsx(
  headings: readonly string[],
  rows: AsyncIterable<readonly OutCell[]>,
  output: Writable,
  sheetName = 'Homes',
): Promise<void> {
  const ended = once(output, 'finish')
  // Whoever awaits the writing is told; a failure before that must not count as nobody's.
  ended.catch(() => undefined)
  try {
    const workbook = new ExcelJs.stream.xlsx.WorkbookWriter({ stream: output, useStyles: true })
    const sheet = workbook.addWorksheet(sheetName, { views: [{ state: 'frozen', ySplit: 1 }] })
    const head = sheet.addRow(headings.map(neutralCell))
    head.font = { bold: true }
    head.commit()
    let written = 0
    for await (const row of rows) {
      sheet.addRow(row.map(neutralCell)).commit()
      if (++written % TURN !== 0) continue
      await setImmediate()
      if (output.writableNeedDrain) await Promise.race([once(output, 'drain'), ended])
    }
    await workbook.commit()
    await ended
  } catch (thrown) {
    output.destroy()
    throw thrown
  }
}
