import { type Way, type WayDevice } from '@/lib/electrical/consumer-unit'
import { CELL_GAP, CELL_WIDTH, MODULE_WIDTH } from './board-paths'

export type PlacedWay = { readonly device: WayDevice; readonly x: number; readonly number: number }
export type BoardLayout = {
  readonly ways: readonly PlacedWay[]
  /** left edges of the RCDs, each of which stands before the ways it protects */
  readonly rcds: readonly number[]
  /** left and right ends of what each RCD protects, itself included */
  readonly brackets: readonly (readonly [from: number, to: number])[]
  readonly width: number
}

/** Where the first way stands: behind the main switch and a little air. */
export const FIRST_WAY = MODULE_WIDTH + 2 * CELL_GAP

/**
 * Where each part of a board stands, from the main switch rightwards [cell units].
 * @example layOutBoard([{ device: 'breaker', behindRcd: 0 }]).width // 96
 */
export function layOutBoard(ways: readonly Way[]): BoardLayout {
  const placed: PlacedWay[] = []
  const rcds: number[] = []
  const brackets: [number, number][] = []
  let x = FIRST_WAY
  let rcd = 0
  for (const [at, { device, behindRcd }] of ways.entries()) {
    if (behindRcd > 0 && behindRcd !== rcd) {
      rcds.push(x)
      brackets.push([x + 1, x])
      x += MODULE_WIDTH + CELL_GAP
    }
    rcd = behindRcd
    placed.push({ device, x, number: at + 1 })
    const open = brackets.at(-1)
    if (behindRcd > 0 && open) open[1] = x + CELL_WIDTH - 1
    x += CELL_WIDTH + CELL_GAP
  }
  return { ways: placed, rcds, brackets, width: x - CELL_GAP }
}
