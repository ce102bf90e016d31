import { type Shift } from '@/lib/risk/assessment'

/** A shift with where it begins and ends along the track, from the base on [steps]. */
export type PlacedShift = { readonly shift: Shift; readonly from: number; readonly to: number }
export type ShiftTrack = {
  readonly placed: readonly PlacedShift[]
  /** both ends of the track [steps] */
  readonly least: number
  readonly most: number
}

/**
 * The shifts of a hazard end to end: those that are known first, the largest first, then the unknown ones.
 * @example layOutShifts([no RCD +2.25, breakers 0]).placed[0] // { shift: no RCD, from: 0, to: 2.25 }
 */
export function layOutShifts(shifts: readonly Shift[]): ShiftTrack {
  const sorted = [...shifts].sort(
    (a, b) => Number(a.unknown) - Number(b.unknown) || Math.abs(b.steps) - Math.abs(a.steps),
  )
  const placed: PlacedShift[] = []
  let at = 0
  for (const shift of sorted) {
    placed.push({ shift, from: at, to: at + shift.steps })
    at += shift.steps
  }
  const ends = placed.flatMap(({ from, to }) => [from, to])
  return { placed, least: Math.min(0, ...ends), most: Math.max(1, ...ends) }
}
