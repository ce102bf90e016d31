import { type Scope } from '@/db/connection'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type SheetFile } from '@/lib/gateways/sheets/sheet-file'
import { type Nation } from '@/lib/homes/nation'
import { type HomeDraft } from '@/lib/imports/home-draft'
import { type ImportLayout } from '@/lib/imports/import-layout'
import { changesAnything, type MergePlan } from '@/lib/imports/merge-draft'
import { createTally } from '@/lib/imports/tally-outcomes'
import { type ImportReport } from './import-report'
import { planDrafts } from './plan-drafts'
import { type ReadRow, readDrafts } from './read-drafts'

const CHUNK = 1_000

/** Told what is found on the way, where somebody wants to know. */
export type RehearsalListener = {
  readonly onRow?: (read: ReadRow) => void
  readonly onClash?: (row: number, why: string) => void
  readonly onChange?: (row: number, change: MergePlan['changes'][number]) => void
  readonly afterChunk?: (rows: number) => Promise<void>
}

/** Reads a whole file and counts what taking it in would do. Writes nothing. */
export async function rehearse(
  scope: Scope,
  sheets: SheetFile,
  layout: ImportLayout,
  context: { readonly today: CalendarDay; readonly nation: Nation },
  listener: RehearsalListener = {},
): Promise<ImportReport> {
  const sheet = layout.sheets.find(({ index }) => index === layout.sheet)?.name ?? ''
  const tally = createTally({ ...context, sheet, headerRow: layout.headerRow })
  const homes = { added: 0, changed: 0, unchanged: 0 }
  const kept: Record<string, number> = {}
  let clashCount = 0
  let rows = 0
  let sincePlan = 0
  let drafts: HomeDraft[] = []
  const plan = async () => {
    const { plans, clashes } = await planDrafts(scope, drafts, context.nation)
    drafts = []
    sincePlan = 0
    clashCount += clashes.length
    for (const { draft, why } of clashes) listener.onClash?.(draft.row, why)
    for (const one of plans) {
      homes[one.known === null ? 'added' : changesAnything(one) ? 'changed' : 'unchanged'] += 1
      for (const what of one.kept) kept[what] = (kept[what] ?? 0) + 1
      for (const change of one.changes) listener.onChange?.(one.draft.row, change)
    }
    await listener.afterChunk?.(rows)
  }
  for await (const read of readDrafts(sheets, layout, context)) {
    rows += 1
    sincePlan += 1
    tally.add(read.outcome)
    listener.onRow?.(read)
    if (read.outcome.kind === 'accepted') drafts.push(read.outcome.draft)
    if (sincePlan >= CHUNK) await plan()
  }
  await plan()
  return { tally: tally.result(), homes, clashes: clashCount, kept }
}
