import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type SheetFile } from '@/lib/gateways/sheets/sheet-file'
import { type Nation } from '@/lib/homes/nation'
import { type SheetRow } from '@/lib/imports/cell'
import { createRowReader } from '@/lib/imports/create-row-reader'
import { type ImportLayout } from '@/lib/imports/import-layout'
import { type RowOutcome } from '@/lib/imports/row-outcome'

export type ReadRow = { readonly row: SheetRow; readonly outcome: RowOutcome }

/** Reads the rows under the header, one at a time. */
export async function* readDrafts(
  sheets: SheetFile,
  layout: Pick<ImportLayout, 'sheet' | 'headerRow' | 'headings' | 'mapping'>,
  context: { today: CalendarDay; nation: Nation },
): AsyncGenerator<ReadRow> {
  const reader = createRowReader({ mapping: layout.mapping, headings: layout.headings, ...context })
  for await (const row of sheets.rows(layout.sheet))
    if (row.number > layout.headerRow) yield { row, outcome: reader.read(row) }
}
