import { reading } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import * as organisations from '@/db/repositories/organisations'
import { removeFile } from '@/lib/gateways/files'
import { type Job, type JobContext } from '@/lib/use-cases/jobs/job'
import { withStoredSheets } from './import-file'
import { takeFileIn } from './take-file-in'

/** Takes a checked and confirmed file into the register. Running it again after a crash starts from nothing. */
async function applyImport({ organisationId, payload, today, progress }: JobContext): Promise<void> {
  const scope = reading({ organisationId })
  const found = await imports.getById(scope, String(payload.importId))
  const layout = found.layout
  if (found.state !== 'importing' || !layout) return
  const { nation } = await organisations.get(scope)
  await withStoredSheets(found.fileKey, (sheets) =>
    takeFileIn(scope, {
      importId: found.id,
      sheets,
      layout,
      fileName: found.fileName,
      actorId: typeof payload.actorId === 'string' ? payload.actorId : null,
      nation,
      today,
      progress: (rows) => progress(rows, found.rowsTotal),
    }),
  )
  await removeFile(found.fileKey)
}

export const applyImportJob: Job = {
  kind: 'apply-import',
  run: applyImport,
  giveUp: async ({ organisationId, payload }, why) => {
    await imports.move(reading({ organisationId }), String(payload.importId), ['importing'], 'failed', {
      failure: `${why} Nothing of the file was taken in.`,
    })
  },
}
