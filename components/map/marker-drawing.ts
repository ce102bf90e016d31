/**
 * Markers of the map as parts of an SVG: a way of the board strip on a plate, with the rings of the score round it; and
 * for several homes a plate with their number over a bar of what is on their walls. One list serves the legend, which
 * React draws, and the map, which needs text.
 */
import { CELL_HEIGHT, CELL_WIDTH, DEVICE_LAYERS } from '@/components/drawings/board-paths'
import { type WayDevice } from '@/lib/electrical/consumer-unit'
import { type BoardType } from '@/lib/homes/board-type'
import { type ScoreRing } from './score-ring'

export type Part = {
  readonly d: string
  readonly className: string
  readonly strokeWidth?: number
  readonly dashed?: boolean
  readonly transform?: string
}

/** A marker is drawn on a square of so many units, a unit a pixel. */
export const MARKER_SIZE = 44

const WAYS: Record<BoardType, readonly WayDevice[]> = {
  rewireable: ['rewireable'],
  mixed: ['rewireable', 'breaker'],
  cartridge: ['cartridge'],
  breakers: ['breaker'],
  rcbo: ['rcbo'],
  unknown: ['unknown'],
}
const box = (width: number, height: number, radius: number) => {
  const [x, y] = [(MARKER_SIZE - width) / 2, (MARKER_SIZE - height) / 2]
  const r = radius
  return (
    `M${x + r} ${y}h${width - 2 * r}a${r} ${r} 0 0 1 ${r} ${r}v${height - 2 * r}a${r} ${r} 0 0 1 ${-r} ${r}` +
    `h${2 * r - width}a${r} ${r} 0 0 1 ${-r} ${-r}v${2 * r - height}a${r} ${r} 0 0 1 ${r} ${-r}z`
  )
}

/** One home: what protects it, and how high it scores. */
export function homeMarker(board: BoardType, ring: ScoreRing): readonly Part[] {
  const ways = WAYS[board]
  const scale = 0.34
  const width = ways.length * CELL_WIDTH * scale + (ways.length - 1) * 1.5
  const [plateWidth, plateHeight] = [width + 5, CELL_HEIGHT * scale + 5]
  const parts: Part[] = []
  const rings = { double: 2, single: 1, none: 0 }[ring]
  for (let at = rings; at > 0; at -= 1)
    parts.push({
      d: box(plateWidth - 1 + at * 6, plateHeight - 1 + at * 6, 4 + at * 2.5),
      className: `fill-surface ${ring === 'double' ? 'stroke-madder' : 'stroke-ink'}`,
      strokeWidth: 1.75,
    })
  parts.push({ d: box(plateWidth, plateHeight, 4), className: 'fill-surface' })
  ways.forEach((device, index) => {
    const left = (MARKER_SIZE - width) / 2 + index * (CELL_WIDTH * scale + 1.5)
    const top = (MARKER_SIZE - CELL_HEIGHT * scale) / 2
    for (const { look, path, bold } of DEVICE_LAYERS[device])
      parts.push({
        d: path(0),
        className: look,
        strokeWidth: bold ? 6 : 3.5,
        dashed: device === 'unknown',
        transform: `translate(${left.toFixed(2)} ${top.toFixed(2)}) scale(${scale})`,
      })
  })
  return parts
}

/** Shares of a cluster's bar in their order: with rewireable ways, not known, all others. */
export function sharesOf(boards: Readonly<Record<BoardType, number>>): {
  rewireable: number
  unknown: number
  other: number
} {
  const rewireable = boards.rewireable + boards.mixed
  const { unknown } = boards
  return { rewireable, unknown, other: boards.cartridge + boards.breakers + boards.rcbo }
}

/** The width of a cluster's plate: more homes, wider, so that the number always fits [px]. */
export const clusterWidth = (homes: number): number => 26 + 8 * String(homes).length

/** The parts of a cluster; its number is text and stands above the bar. */
export function clusterMarker(
  homes: number,
  boards: Readonly<Record<BoardType, number>>,
  ring: ScoreRing,
): readonly Part[] {
  const width = clusterWidth(homes)
  const height = 28
  const at = (x: number, y: number, w: number, h: number) =>
    `M${x.toFixed(2)} ${y}h${w.toFixed(2)}v${h}h${(-w).toFixed(2)}z`
  const left = (MARKER_SIZE - width) / 2
  const inner = width - 10
  const { rewireable, unknown } = sharesOf(boards)
  const [copper, dashed] = [(inner * rewireable) / homes, (inner * unknown) / homes]
  const parts: Part[] = []
  const rings = { double: 2, single: 1, none: 0 }[ring]
  for (let count = rings; count > 0; count -= 1)
    parts.push({
      d: box(width + count * 6, height + count * 6, 6 + count * 2.5),
      className: `fill-surface ${ring === 'double' ? 'stroke-madder' : 'stroke-edge'}`,
      strokeWidth: ring === 'double' ? 1.75 : 1,
    })
  parts.push({ d: box(width, height, 6), className: 'fill-surface stroke-ink', strokeWidth: 1.5 })
  parts.push({ d: at(left + 5, 29, inner, 4), className: 'fill-plate' })
  if (copper > 0) parts.push({ d: at(left + 5, 29, copper, 4), className: 'fill-copper' })
  if (dashed > 0)
    parts.push({
      d: at(left + 5 + copper, 29.5, dashed, 3),
      className: 'fill-surface stroke-blueprint',
      strokeWidth: 1,
      dashed: true,
    })
  return parts
}

const dashes = (part: Part) => (part.transform ? '10 8' : '1.5 1.5')

/** The dash of a part that is drawn dashed. */
export const dashOf = (part: Part): string | undefined => (part.dashed ? dashes(part) : undefined)

/** The parts as SVG text: numbers and our own class names only, so there is nothing to escape. */
export function svgText(parts: readonly Part[], label?: string): string {
  const paths = parts.map((part) => {
    const stroke = part.className.includes('stroke-') ? ` stroke-width="${part.strokeWidth ?? 1}"` : ''
    const dash = dashOf(part)
    return `<path class="${part.className}" d="${part.d}"${stroke}${dash ? ` stroke-dasharray="${dash}"` : ''}${part.transform ? ` transform="${part.transform}"` : ''}/>`
  })
  const number = label
    ? `<text x="${MARKER_SIZE / 2}" y="25" text-anchor="middle" class="fill-ink font-sans text-[14px] font-bold tabular-nums">${label}</text>`
    : ''
  return `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${MARKER_SIZE} ${MARKER_SIZE}" width="${MARKER_SIZE}" height="${MARKER_SIZE}" class="overflow-visible" aria-hidden="true">${paths.join('')}${number}</svg>`
}
