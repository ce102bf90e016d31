import { z } from 'zod'
import { reads } from '@/app/api/read'
import { rejectedRows } from '@/lib/use-cases/imports/rejected-rows'
import { sendTable, TABLE_FORMATS } from '@/lib/use-cases/exports/send-table'

const Wanted = z.object({ importId: z.uuid(), format: z.enum(TABLE_FORMATS).catch('csv') })

/** The rejected rows as a file, to mend and send again. */
export const GET = reads(Wanted, async (actor, { importId, format }) => {
  const { fileName, headings, rows } = await rejectedRows(actor, { importId })
  return sendTable({ name: `${fileName.replace(/\.\w{2,5}$/, '')} rejected rows`, format, headings, rows })
})
