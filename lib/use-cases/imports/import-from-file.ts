import { basename } from 'node:path'
import { deployment, inTransaction, reading } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import * as organisations from '@/db/repositories/organisations'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Invalid, NotFound } from '@/lib/errors/expected'
import { type ImportLayout } from '@/lib/imports/import-layout'
import { mappingFromFile } from '@/lib/imports/mapping-from-file'
import { newId } from '@/lib/platform/new-id'
import { withSheets } from './import-file'
import { type ImportReport } from './import-report'
import { layoutOfSheet } from './layout-of-sheet'
import { rehearse } from './rehearse'
import { takeFileIn } from './take-file-in'

export type FileImport = {
  readonly path: string
  readonly organisation: string
  /** the text of a mapping file; where there is none, the columns are guessed */
  readonly mapping?: string
  readonly today: CalendarDay
  readonly dryRun: boolean
}

export type FileImportResult = {
  readonly layout: ImportLayout
  readonly report: ImportReport
  readonly importId: string | null
}

/**
 * Imports a local file for an organisation, as an operator does from the command line.
 * @throws NotFound where no organisation has that name, Invalid where the file or the mapping cannot be read
 */
export async function importFromFile(file: FileImport): Promise<FileImportResult> {
  const organisation = await organisations.findBySlug(deployment(), file.organisation)
  if (!organisation) throw new NotFound(`The organisation "${file.organisation}"`)
  const owner = { organisationId: organisation.id }
  const scope = reading(owner)
  return withSheets(file.path, async (sheets) => {
    const guessed = await layoutOfSheet(scope, sheets, file.today)
    const layout =
      file.mapping === undefined
        ? guessed
        : { ...guessed, mapping: mappingFromFile(file.mapping, guessed.headings) }
    if (layout.mapping.address === undefined && layout.mapping.street === undefined)
      throw new Invalid([
        {
          field: 'mapping',
          problem: 'No column was found that holds the address. Give a mapping file with --mapping.',
        },
      ])
    const { nation } = organisation
    if (file.dryRun)
      return {
        layout,
        report: await rehearse(scope, sheets, layout, { today: file.today, nation }),
        importId: null,
      }
    const importId = newId()
    const fileName = basename(file.path)
    await inTransaction(owner, async (writing) => {
      await imports.insert(writing, {
        id: importId,
        fileName,
        fileKey: '',
        fileSize: 0,
        fileSha256: '',
        layout,
        startedBy: null,
      })
      await imports.move(writing, importId, ['uploaded'], 'importing')
    })
    try {
      const report = await takeFileIn(scope, {
        importId,
        sheets,
        layout,
        fileName,
        actorId: null,
        nation,
        today: file.today,
        progress: async () => undefined,
      })
      if (!report) throw new Error('the import was ended by somebody else')
      return { layout, report, importId }
    } catch (thrown) {
      const failure = thrown instanceof Error ? thrown.message : String(thrown)
      await imports.move(scope, importId, ['importing'], 'failed', {
        failure: `${failure} Nothing of the file was taken in.`,
      })
      throw thrown
    }
  })
}
