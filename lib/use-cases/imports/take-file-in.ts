import { type Scope, inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as imports from '@/db/repositories/imports'
import * as problems from '@/db/repositories/import-problems'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type SheetFile } from '@/lib/gateways/sheets/sheet-file'
import { type Nation } from '@/lib/homes/nation'
import { type Cell } from '@/lib/imports/cell'
import { type HomeDraft } from '@/lib/imports/home-draft'
import { type ImportLayout } from '@/lib/imports/import-layout'
import { createTally } from '@/lib/imports/tally-outcomes'
import { createDraftApplier } from './apply-drafts'
import { headingsKey } from './headings-key'
import { figuresOf, type ImportReport } from './import-report'
import { createProblemLog } from './problem-log'
import { readDrafts } from './read-drafts'

export type FileToTakeIn = {
  readonly importId: string
  readonly sheets: SheetFile
  readonly layout: ImportLayout
  readonly fileName: string
  readonly actorId: string | null
  readonly nation: Nation
  readonly today: CalendarDay
  /** told now and then how many rows are done; may throw to stop */
  readonly progress: (rows: number) => Promise<void>
}

/** How many homes are handed on at once. */
const CHUNK = 500

/**
 * Takes a whole file into the register in one transaction: all of it, or nothing where the process dies.
 * @returns the report, or null where the import was no longer waiting for it
 */
export function takeFileIn(scope: Scope, file: FileToTakeIn): Promise<ImportReport | null> {
  const { importId, sheets, layout, today, nation } = file
  return inTransaction(
    scope,
    async (writing) => {
      await problems.clear(writing, importId)
      const problemLog = createProblemLog(importId, layout)
      const sheetName = layout.sheets.find(({ index }) => index === layout.sheet)?.name ?? ''
      const tally = createTally({ today, nation, sheet: sheetName, headerRow: layout.headerRow })
      let clashes = 0
      let drafts: HomeDraft[] = []
      const cellsOf = new Map<number, readonly Cell[]>()
      const applier = await createDraftApplier(writing, {
        actorId: file.actorId,
        source: file.fileName,
        nation,
        today,
        onClash: (row, why) => {
          clashes += 1
          problemLog.addClash(row, why, cellsOf.get(row) ?? [])
        },
        onChange: (row, change) => problemLog.addChange(row, change),
      })
      let rows = 0
      for await (const { row, outcome } of readDrafts(sheets, layout, { today, nation })) {
        rows += 1
        tally.add(outcome)
        if (outcome.kind === 'accepted') {
          drafts.push(outcome.draft)
          cellsOf.set(row.number, row.cells)
        }
        if (outcome.kind === 'accepted' || outcome.kind === 'rejected')
          problemLog.addRow(row, outcome.problems)
        if (rows % CHUNK === 0) {
          await applier.apply(drafts)
          drafts = []
          cellsOf.clear()
          await problemLog.write(writing)
          await file.progress(rows)
        }
      }
      await applier.apply(drafts)
      const homes = await applier.finish()
      await problemLog.write(writing)
      const report: ImportReport = { tally: tally.result(), homes, clashes, kept: applier.kept() }
      if (!(await imports.move(writing, importId, ['importing'], 'done', { report: figuresOf(report) })))
        return null
      await imports.saveMapping(writing, headingsKey(layout.headings), layout.mapping)
      await audit.record(writing, {
        actorId: file.actorId,
        did: 'import.taken-in',
        subjectKind: 'import',
        subjectId: importId,
        detail: { rows: report.tally.data_rows, rejected: report.tally.rejected.length + clashes, ...homes },
      })
      return report
    },
    'read committed',
  )
}
