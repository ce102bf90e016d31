import { z } from 'zod'
import { reads } from '@/app/api/read'
import { homeQueryOf } from '@/lib/homes/home-query'
import { exportHomes } from '@/lib/use-cases/homes/export-homes'
import { sendTable, TABLE_FORMATS } from '@/lib/use-cases/exports/send-table'

const Wanted = z
  .looseObject({ format: z.enum(TABLE_FORMATS).catch('csv') })
  .transform(({ format, ...params }) => ({ format, query: homeQueryOf(params as Record<string, string>) }))

/** The homes on screen as a file: the same filter, order and columns. */
export const GET = reads(Wanted, async (actor, { format, query }, today) => {
  const { headings, rows } = await exportHomes(actor, query, today)
  return sendTable({ name: `Homes ${today}`, format, headings, rows })
})
