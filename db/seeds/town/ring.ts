/** Closed outlines on the sheet. A ring does not repeat its first point. */
import { between, distance, type Line, type Point, turned } from './plane'

export type Ring = readonly Point[]

/** Whether the point lies inside the ring (a ray to the east crosses it an odd number of times). */
export function isInside(ring: Ring, [x, y]: Point): boolean {
  let inside = false
  let [x1, y1] = ring.at(-1) as Point
  for (const [x2, y2] of ring) {
    if (y1 > y !== y2 > y && x < x1 + ((y - y1) / (y2 - y1)) * (x2 - x1)) inside = !inside
    x1 = x2
    y1 = y2
  }
  return inside
}

/** The signed area of a ring: above zero where it runs anticlockwise [square metres]. */
export const areaOf = (ring: Ring): number =>
  ring.reduce((sum, [x1, y1], at) => {
    const [x2, y2] = ring[(at + 1) % ring.length] as Point
    return sum + (x1 * y2 - x2 * y1) / 2
  }, 0)

export const middleOf = (ring: Ring): Point => [
  ring.reduce((sum, [x]) => sum + x, 0) / ring.length,
  ring.reduce((sum, [, y]) => sum + y, 0) / ring.length,
]

/** A rectangle about a middle, its long side `width` at an angle [metres, radians]. */
export const rectangle = (middle: Point, width: number, depth: number, angle: number): Point[] =>
  (
    [
      [-1, -1],
      [1, -1],
      [1, 1],
      [-1, 1],
    ] as const
  ).map(([x, y]) => turned([middle[0] + (x * width) / 2, middle[1] + (y * depth) / 2], angle, middle))

function crossing(a: Point, b: Point, c: Point, d: Point): number | null {
  const [rx, ry, sx, sy] = [b[0] - a[0], b[1] - a[1], d[0] - c[0], d[1] - c[1]]
  const cross = rx * sy - ry * sx
  if (Math.abs(cross) < 1e-9) return null
  const t = ((c[0] - a[0]) * sy - (c[1] - a[1]) * sx) / cross
  const u = ((c[0] - a[0]) * ry - (c[1] - a[1]) * rx) / cross
  return t >= 0 && t <= 1 && u >= 0 && u <= 1 ? t : null
}

/** Whether two stretches cross. */
export const cross = (a: Point, b: Point, c: Point, d: Point): boolean => crossing(a, b, c, d) !== null

/** The parts of a line that lie inside a ring, cut exactly at its edge; pieces shorter than `least` fall away. */
export function clippedTo(ring: Ring, line: Line, least = 30): Point[][] {
  const pieces: Point[][] = []
  let piece: Point[] = []
  const close = () => {
    if (piece.length > 1) pieces.push(piece)
    piece = []
  }
  for (let at = 1; at < line.length; at += 1) {
    const [from, to] = [line[at - 1] as Point, line[at] as Point]
    const cuts = [0, 1]
    ring.forEach((corner, index) => {
      const share = crossing(from, to, corner, ring[(index + 1) % ring.length] as Point)
      if (share !== null) cuts.push(share)
    })
    cuts.sort((a, b) => a - b)
    for (let cut = 1; cut < cuts.length; cut += 1) {
      const [start, end] = [cuts[cut - 1] as number, cuts[cut] as number]
      if (end - start < 1e-9) continue
      if (!isInside(ring, between(from, to, (start + end) / 2))) close()
      else {
        if (piece.length === 0) piece.push(between(from, to, start))
        piece.push(between(from, to, end))
      }
    }
  }
  close()
  return pieces.filter(
    (one) => one.reduce((sum, p, at) => (at ? sum + distance(one[at - 1] as Point, p) : 0), 0) >= least,
  )
}

/** Whether two convex rings overlap (no axis along an edge separates them). */
export const overlap = (a: Ring, b: Ring): boolean => !isApart(a, b) && !isApart(b, a)

/** Whether an edge of the first ring has all of the second on its far side, or all of it beyond the first's own reach. */
function isApart(first: Ring, second: Ring): boolean {
  let [x1, y1] = first.at(-1) as Point
  for (const [x2, y2] of first) {
    const [ax, ay] = [y1 - y2, x2 - x1]
    let [least, most, otherLeast, otherMost] = [Infinity, -Infinity, Infinity, -Infinity]
    for (const [x, y] of first) {
      const along = x * ax + y * ay
      if (along < least) least = along
      if (along > most) most = along
    }
    for (const [x, y] of second) {
      const along = x * ax + y * ay
      if (along < otherLeast) otherLeast = along
      if (along > otherMost) otherMost = along
    }
    if (most <= otherLeast || otherMost <= least) return true
    x1 = x2
    y1 = y2
  }
  return false
}
