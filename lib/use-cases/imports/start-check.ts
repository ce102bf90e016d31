import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import * as jobs from '@/db/repositories/jobs'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { Conflict, Invalid } from '@/lib/errors/expected'
import { listOf } from '@/lib/forms/list-of'
import { IMPORT_FIELDS } from '@/lib/imports/home-draft'
import { mappingOfColumns } from '@/lib/imports/import-layout'

export const StartCheck = z.object({
  importId: z.uuid(),
  /** for each column in order, its field; '' leaves it out */
  columns: listOf(z.enum(['', ...IMPORT_FIELDS])),
})

/** Keeps the chosen columns and starts the dry run. */
export async function startCheck(actor: Actor, input: z.infer<typeof StartCheck>) {
  demand(actor, 'imports.run')
  return inTransaction(actor, async (scope) => {
    const found = await imports.getById(scope, input.importId)
    if (!found.layout) throw new Conflict('This import has no sheet chosen yet.')
    if (input.columns.length !== found.layout.headings.length)
      throw new Conflict(
        'The columns have changed since this page was loaded. Load it again and choose once more.',
      )
    const { mapping, problems } = mappingOfColumns(input.columns)
    if (problems.length > 0) throw new Invalid(problems)
    const attempt = found.attempt + 1
    const layout = { ...found.layout, mapping }
    if (
      !(await imports.move(scope, found.id, ['uploaded', 'checked'], 'checking', {
        layout,
        attempt,
        report: null,
      }))
    )
      throw new Conflict('This import has moved on. Load the page again to see where it is.')
    await jobs.enqueue(scope, {
      kind: 'check-import',
      businessKey: `${found.id}:${attempt}`,
      payload: { importId: found.id },
    })
    return { id: found.id }
  })
}
