import { type Scope } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Invalid } from '@/lib/errors/expected'
import { type SheetFile } from '@/lib/gateways/sheets/sheet-file'
import { findHeader } from '@/lib/imports/find-header'
import { guessMapping } from '@/lib/imports/guess-mapping'
import { cellText, type ImportLayout } from '@/lib/imports/import-layout'
import { pickSheet } from '@/lib/imports/pick-sheet'
import { headingsKey } from './headings-key'

const PREVIEW_ROWS = 60
const SAMPLE_ROWS = 5

const DELIMITER_NAMES = { ',': 'commas', ';': 'semicolons', '\t': 'tabs', '|': 'upright strokes' } as const
const ENCODING_NAMES = {
  'utf-8': 'UTF-8',
  'utf-16le': 'UTF-16',
  'utf-16be': 'UTF-16',
  'windows-1252': 'Windows-1252',
} as const

function kindInWords({ kind, delimiter, encoding }: SheetFile): string {
  if (kind === 'xlsx') return 'Excel workbook'
  return `Text separated by ${DELIMITER_NAMES[delimiter ?? ',']}, ${ENCODING_NAMES[encoding ?? 'utf-8']}`
}

/** How the file is most likely to be read: its sheet, header row and columns; a person may put it right. */
export async function layoutOfSheet(
  scope: Scope,
  sheets: SheetFile,
  today: CalendarDay,
  chosen: { sheet?: number; headerRow?: number } = {},
): Promise<ImportLayout> {
  const previews = await Promise.all(
    sheets.sheets.map(async ({ name, index }) => ({
      name,
      index,
      rows: await sheets.preview(index, PREVIEW_ROWS),
    })),
  )
  const preview = previews.find(({ index }) => index === (chosen.sheet ?? pickSheet(previews)?.index))
  if (!preview) throw new Invalid([{ field: 'sheet', problem: 'Choose one of the sheets in the file.' }])
  const headerRow = chosen.headerRow ?? findHeader(preview.rows).headerRow
  const header = preview.rows.find(({ number }) => number === headerRow)
  if (!header)
    throw new Invalid([
      {
        field: 'headerRow',
        problem: `There is nothing in row ${headerRow}. Give the row with the column headings.`,
      },
    ])
  const below = preview.rows.filter(({ number }) => number > headerRow)
  const headings = header.cells.map((cell) => cellText(cell).trim().slice(0, 120))
  const remembered = await imports.findMapping(scope, headingsKey(headings))
  return {
    fileKind: kindInWords(sheets),
    sheets: sheets.sheets,
    sheet: preview.index,
    headerRow,
    headings,
    sample: below
      .filter(({ cells }) => cells.some((cell) => cellText(cell).trim() !== ''))
      .slice(0, SAMPLE_ROWS)
      .map(({ cells }) => headings.map((_, column) => cellText(cells[column]).slice(0, 80))),
    mapping: remembered ?? guessMapping(header.cells, below, today),
  }
}
