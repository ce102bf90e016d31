import { reading } from '@/db/connection'
import * as counts from '@/db/repositories/home-register-counts'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'

export type RewireableByPatch = {
  readonly patches: readonly counts.PatchCount[]
  readonly totals: { readonly homes: number; readonly withRewireableWays: number; readonly unknown: number }
}

/** Which homes still have rewireable fuses, by patch; those whose board is not known are counted apart. */
export async function countRewireableByPatch(actor: Actor, _today: CalendarDay): Promise<RewireableByPatch> {
  demand(actor, 'homes.read')
  const patches = await counts.countByPatch(reading(actor), reachOf(actor))
  const sum = (of: 'homes' | 'withRewireableWays' | 'unknown') =>
    patches.reduce((total, patch) => total + patch[of], 0)
  return {
    patches,
    totals: { homes: sum('homes'), withRewireableWays: sum('withRewireableWays'), unknown: sum('unknown') },
  }
}
