import { type SheetName, type SheetRow } from './cell'
import { findHeader } from './find-header'

export type SheetPreview = SheetName & { readonly rows: readonly SheetRow[] }

/**
 * The sheet that looks most like a stock list, with its row of headings; null where the file has no sheet.
 * @param previews the first rows of each sheet, 50 or so
 * @example pickSheet(previews) // { index: 1, name: 'Stock 2026', headerRow: 4, score: 23.1 }
 */
export function pickSheet(
  previews: readonly SheetPreview[],
): (SheetName & { headerRow: number; score: number }) | null {
  let best: (SheetName & { headerRow: number; score: number }) | null = null
  for (const { index, name, rows } of previews) {
    const header = findHeader(rows)
    // Headings without a row below them are a form, or a list of what the columns mean.
    const score = rows.some((row) => row.number > header.headerRow) ? header.score : header.score / 2
    if (best === null || score > best.score) best = { index, name, headerRow: header.headerRow, score }
  }
  return best
}
