import { reading } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import * as problems from '@/db/repositories/import-problems'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { cellText } from '@/lib/imports/import-layout'

const PAGE = 500

/** The rejected rows as they were, with the row number and every reason in columns of their own: to mend and send again. */
export async function rejectedRows(actor: Actor, input: { importId: string }) {
  demand(actor, 'imports.read')
  const scope = reading(actor)
  const found = await imports.getById(scope, input.importId)
  const headings = found.layout?.headings ?? []

  async function* rows(): AsyncGenerator<(string | number | null)[]> {
    let after: { row: number; sequence: number } | null = null
    let waiting: { row: number; whys: string[]; cells: string[] } | null = null
    for (;;) {
      const page: Awaited<ReturnType<typeof problems.list>> = await problems.list(
        scope,
        found.id,
        'rejected',
        { after, limit: PAGE },
      )
      for (const one of page) {
        if (waiting && waiting.row !== one.row) {
          yield [...waiting.cells, waiting.row, waiting.whys.join('; ')]
          waiting = null
        }
        const why = one.heading ? `${one.heading}: ${one.why}` : one.why
        if (waiting) waiting.whys.push(why)
        else
          waiting = {
            row: one.row,
            whys: [why],
            cells: headings.map((_, column) => cellText(one.rawRow?.[column])),
          }
        after = { row: one.row, sequence: one.sequence }
      }
      if (page.length < PAGE) break
    }
    if (waiting) yield [...waiting.cells, waiting.row, waiting.whys.join('; ')]
  }

  return {
    fileName: found.fileName,
    headings: [...headings, 'Row in your file', 'Why it was not taken'],
    rows: rows(),
  }
}
