import * as intake from '@/db/repositories/home-intake-writes'
import { addMissing, listByName } from '@/db/repositories/named-places'
import { type WritingScope } from '@/db/connection'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { foldName } from '@/lib/homes/fold-name'
import { type Nation } from '@/lib/homes/nation'
import { type HomeDraft } from '@/lib/imports/home-draft'
import { changesAnything, type MergePlan } from '@/lib/imports/merge-draft'
import { newId } from '@/lib/platform/new-id'
import { refreshHomes } from '@/lib/use-cases/homes/refresh-homes'
import { planDrafts } from './plan-drafts'

export type Applied = { added: number; changed: number; unchanged: number }

export type ApplyContext = {
  /** null: the operator */
  readonly actorId: string | null
  /** where it came from, for the facts' note: "stock-list.xlsx" */
  readonly source: string
  readonly nation: Nation
  readonly today: CalendarDay
  /** told of every row that could not be applied, and of every identity that changed */
  readonly onClash?: (row: number, why: string) => void
  readonly onChange?: (row: number, change: MergePlan['changes'][number]) => void
}

/** How many drafts go into the register at once. */
const CHUNK = 500

/**
 * Takes drafts into the register within one transaction: matches, merges, writes, refreshes the derived rows
 * and the scores. Applying the same drafts twice changes nothing the second time.
 */
export async function createDraftApplier(scope: WritingScope, context: ApplyContext) {
  const patches = await listByName(scope, 'patches')
  const blocks = await listByName(scope, 'blocks')
  const applied: Applied = { added: 0, changed: 0, unchanged: 0 }
  const kept: Record<string, number> = {}
  let waiting: HomeDraft[] = []

  async function applyChunk(drafts: readonly HomeDraft[]): Promise<void> {
    const { plans, clashes } = await planDrafts(scope, drafts, context.nation)
    for (const { draft, why } of clashes) context.onClash?.(draft.row, why)
    const active = plans.filter((plan) => plan.known === null || changesAnything(plan))
    applied.added += active.filter((plan) => plan.known === null).length
    applied.changed += active.filter((plan) => plan.known !== null).length
    applied.unchanged += plans.length - active.length
    for (const plan of plans) for (const what of plan.kept) kept[what] = (kept[what] ?? 0) + 1
    if (active.length === 0) return
    await addMissing(
      scope,
      'patches',
      active.flatMap(({ identity }) => identity.patch ?? []),
      patches,
    )
    await addMissing(
      scope,
      'blocks',
      active.flatMap(({ identity }) => identity.block ?? []),
      blocks,
    )
    const placed = active.map((plan) => ({
      homeId: plan.known?.id ?? newId(),
      patchId: plan.identity.patch === null ? null : (patches.get(foldName(plan.identity.patch)) ?? null),
      blockId: plan.identity.block === null ? null : (blocks.get(foldName(plan.identity.block)) ?? null),
      plan,
    }))
    const from = { actorId: context.actorId, asOf: context.today, source: context.source }
    await intake.writeHomes(scope, placed)
    await intake.writeFacts(scope, placed, from)
    await intake.writeInspections(scope, placed, from)
    await intake.writeDefects(scope, placed, from)
    await refreshHomes(
      scope,
      placed.map(({ homeId }) => homeId),
      context.today,
    )
    for (const plan of active) for (const change of plan.changes) context.onChange?.(plan.draft.row, change)
  }

  return {
    /** Takes some drafts; full chunks are written at once. */
    async apply(drafts: readonly HomeDraft[]): Promise<void> {
      waiting.push(...drafts)
      while (waiting.length >= CHUNK) {
        const chunk = waiting.slice(0, CHUNK)
        waiting = waiting.slice(CHUNK)
        await applyChunk(chunk)
      }
    },
    /** How often the register's own word was kept against the drafts', by what it was about. */
    kept: (): Readonly<Record<string, number>> => kept,
    /** Writes what is left, and tells what was done. */
    async finish(): Promise<Applied> {
      if (waiting.length > 0) await applyChunk(waiting)
      waiting = []
      return applied
    },
  }
}
