import { inTransaction, reading } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import * as problems from '@/db/repositories/import-problems'
import * as organisations from '@/db/repositories/organisations'
import { type Cell } from '@/lib/imports/cell'
import { type Job, type JobContext } from '@/lib/use-cases/jobs/job'
import { withStoredSheets } from './import-file'
import { figuresOf } from './import-report'
import { createProblemLog } from './problem-log'
import { rehearse } from './rehearse'

/** The dry run: reads the whole file, lists every problem, and counts what an import would do. Changes no home. */
async function checkImport({ organisationId, payload, today, progress }: JobContext): Promise<void> {
  const scope = reading({ organisationId })
  const found = await imports.getById(scope, String(payload.importId))
  const layout = found.layout
  if (found.state !== 'checking' || !layout) return
  const { nation } = await organisations.get(scope)
  await inTransaction({ organisationId }, (writing) => problems.clear(writing, found.id))
  const problemLog = createProblemLog(found.id, layout)
  const cellsOf = new Map<number, readonly Cell[]>()
  const report = await withStoredSheets(found.fileKey, (sheets) =>
    rehearse(
      scope,
      sheets,
      layout,
      { today, nation },
      {
        onRow: ({ row, outcome }) => {
          if (outcome.kind === 'accepted') cellsOf.set(row.number, row.cells)
          if (outcome.kind === 'accepted' || outcome.kind === 'rejected')
            problemLog.addRow(row, outcome.problems)
        },
        onClash: (row, why) => problemLog.addClash(row, why, cellsOf.get(row) ?? []),
        onChange: (row, change) => problemLog.addChange(row, change),
        afterChunk: async (rows) => {
          cellsOf.clear()
          await inTransaction({ organisationId }, (writing) => problemLog.write(writing))
          await progress(rows, null)
        },
      },
    ),
  )
  await imports.move(scope, found.id, ['checking'], 'checked', {
    report: figuresOf(report),
    rowsTotal: report.tally.data_rows,
  })
}

export const checkImportJob: Job = {
  kind: 'check-import',
  run: checkImport,
  giveUp: async ({ organisationId, payload }, why) => {
    await imports.move(reading({ organisationId }), String(payload.importId), ['checking'], 'failed', {
      failure: why,
    })
  },
}
