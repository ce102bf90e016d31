/**
 * The parts of a board strip as SVG path text. One way is a cell of 36 by 66 units; each function draws a part of the
 * cell whose left edge is at `x`. Parts of one kind are joined into one path, so that a list of fifty boards stays light.
 */
import { type WayDevice } from '@/lib/electrical/consumer-unit'

export const CELL_WIDTH = 36
export const CELL_HEIGHT = 66
export const CELL_GAP = 6
/** The main switch and an RCD are wider than a way. */
export const MODULE_WIDTH = 48

/** What a layer is made of: the ground of a device, its line, or a solid part. */
export type Layer = { readonly look: string; readonly path: (x: number) => string; readonly bold?: boolean }

const box = (x: number, y: number, width: number, height: number, r: number) =>
  `M${x + r} ${y}h${width - 2 * r}a${r} ${r} 0 0 1 ${r} ${r}v${height - 2 * r}a${r} ${r} 0 0 1 ${-r} ${r}` +
  `h${2 * r - width}a${r} ${r} 0 0 1 ${-r} ${-r}v${2 * r - height}a${r} ${r} 0 0 1 ${r} ${-r}z`

const dot = (x: number, y: number, r: number) =>
  `M${x - r} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0z`

const body = (x: number) => box(x + 1.5, 1.5, 33, 63, 4.5)
const moduleBody = (x: number) => box(x + 1.5, 1.5, 45, 63, 4.5)

/** A carrier is open at its sides: the bare wire between its two posts can be seen, and touched. */
const carrier = (x: number) =>
  `M${x + 1.5} 24v-18a4.5 4.5 0 0 1 4.5-4.5h24a4.5 4.5 0 0 1 4.5 4.5v18` +
  `M${x + 1.5} 42v18a4.5 4.5 0 0 0 4.5 4.5h24a4.5 4.5 0 0 0 4.5-4.5v-18`

const wire = (x: number) => `M${x + 23} 12.5c5 24-15 18-10 41`

export const DEVICE_LAYERS: Record<WayDevice, readonly Layer[]> = {
  rewireable: [
    { look: 'fill-copper-wash stroke-copper', path: carrier },
    { look: 'fill-none stroke-copper', path: wire, bold: true },
    { look: 'fill-copper', path: (x) => dot(x + 23, 12.5, 4.5) + dot(x + 13, 53.5, 4.5) },
  ],
  cartridge: [
    { look: 'fill-surface stroke-slate', path: body },
    { look: 'fill-none stroke-slate', path: (x) => box(x + 11, 11, 14, 44, 7) },
    {
      look: 'fill-slate',
      path: (x) => `M${x + 11} 22v-4a7 7 0 0 1 14 0v4zM${x + 11} 44v4a7 7 0 0 0 14 0v-4z`,
    },
  ],
  breaker: [
    { look: 'fill-surface stroke-slate', path: body },
    { look: 'fill-none stroke-slate', path: (x) => box(x + 12, 15, 12, 36, 2) },
    { look: 'fill-ink', path: (x) => box(x + 12, 15, 12, 19, 2) },
  ],
  rcbo: [
    { look: 'fill-verdigris-wash stroke-verdigris', path: body },
    { look: 'fill-verdigris', path: (x) => box(x + 12, 12, 12, 22, 2) + dot(x + 18, 49, 5) },
  ],
  blank: [{ look: 'fill-plate', path: body }],
  unknown: [{ look: 'fill-none stroke-blueprint', path: body }],
}

export const RCD_LAYERS: readonly Layer[] = [
  { look: 'fill-surface stroke-verdigris', path: moduleBody },
  { look: 'fill-verdigris', path: (x) => box(x + 13, 12, 22, 20, 2) + dot(x + 24, 42, 4.5) },
]

export const MAIN_SWITCH_LAYERS: readonly Layer[] = [
  { look: 'fill-ink', path: (x) => box(x, 0, 48, 66, 5) },
  { look: 'fill-paper', path: (x) => box(x + 14, 14, 20, 38, 3) },
  { look: 'fill-ink', path: (x) => box(x + 18, 18, 12, 15, 2) },
]

/** Under the ways that one RCD protects, and under the RCD itself. */
export const bracket = (from: number, to: number) => `M${from} ${CELL_HEIGHT + 4}v5h${to - from}v-5`

/** As `bracket`, without an end: how far it reaches is not known. */
export const openBracket = (from: number, to: number) => `M${from} ${CELL_HEIGHT + 4}v5h${to - from}`

/** Where the board goes on, by how many ways is not known. */
export const openEnd = (x: number) => `M${x} 1.5h40M${x} 64.5h40`
