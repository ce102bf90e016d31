import { z } from 'zod'
import { reading } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Conflict } from '@/lib/errors/expected'
import { withStoredSheets } from './import-file'
import { layoutOfSheet } from './layout-of-sheet'

export const ChangeLayout = z.object({
  importId: z.uuid(),
  sheet: z.coerce.number('Choose one of the sheets in the file.').int().min(0).max(999),
  headerRow: z.coerce
    .number('Give the row number of the column headings.')
    .int('Give a whole number, such as 4.')
    .min(1, 'Rows are numbered from 1.')
    .max(60, 'The column headings must be within the first 60 rows.'),
})

/** Reads the file anew from another sheet or header row, and guesses the columns again. */
export async function changeLayout(actor: Actor, input: z.infer<typeof ChangeLayout>, today: CalendarDay) {
  demand(actor, 'imports.run')
  const scope = reading(actor)
  const found = await imports.getById(scope, input.importId)
  const layout = await withStoredSheets(found.fileKey, (sheets) =>
    layoutOfSheet(scope, sheets, today, { sheet: input.sheet, headerRow: input.headerRow }),
  )
  if (!(await imports.move(scope, found.id, ['uploaded', 'checked'], 'uploaded', { layout, report: null })))
    throw new Conflict('This import has moved on. Load the page again to see where it is.')
  return { id: found.id }
}
