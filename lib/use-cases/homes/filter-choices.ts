import { reading } from '@/db/connection'
import * as counts from '@/db/repositories/home-register-counts'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'

export type FilterChoices = {
  /** the same patches with how many of their homes have rewireable ways, and how many may */
  readonly byPatch: readonly counts.PatchCount[]
  readonly patches: readonly { readonly id: string; readonly name: string; readonly homes: number }[]
  /** homes in no patch; 0 for somebody who sees only some patches */
  readonly inNoPatch: number
  readonly blocks: readonly { readonly id: string; readonly name: string; readonly homes: number }[]
  /** whether there are more blocks than these: the search box finds their homes */
  readonly moreBlocks: boolean
}

const MOST_BLOCKS = 400

/** The patches and blocks that a list can be narrowed to, with how many homes each has within reach. */
export async function filterChoices(actor: Actor, _today: CalendarDay): Promise<FilterChoices> {
  demand(actor, 'homes.read')
  const scope = reading(actor)
  const [patches, blocks] = await Promise.all([
    counts.countByPatch(scope, reachOf(actor)),
    counts.countByBlock(scope, reachOf(actor), MOST_BLOCKS + 1),
  ])
  return {
    byPatch: patches,
    patches: patches.flatMap(({ patch, homes }) => (patch ? [{ ...patch, homes }] : [])),
    inNoPatch: patches.find(({ patch }) => patch === null)?.homes ?? 0,
    blocks: blocks.slice(0, MOST_BLOCKS),
    moreBlocks: blocks.length > MOST_BLOCKS,
  }
}
