import { distanceTo } from './line'
import { distance, type Line, type Point } from './plane'
import { isInside, middleOf, overlap, type Ring } from './ring'

const CELL = 80

type Circle = { readonly middle: Point; readonly radius: number }
type Built = Circle & { readonly ring: Ring }

function circleOf(ring: Ring): Circle {
  const middle = middleOf(ring)
  return { middle, radius: Math.max(...ring.map((corner) => distance(middle, corner))) }
}

/** Room on the sheet: what is built and what is road, so that nothing is drawn on top of another. */
export type Crowding = {
  readonly addBuilding: (ring: Ring) => void
  /** whether a building would stand clear of all others and `metres` from every road */
  readonly isFree: (ring: Ring) => boolean
}

/**
 * @param roads each with the distance that a building keeps from its middle [metres]
 * @param forbidden rings that nobody builds in
 */
export function crowding(
  roads: readonly { line: Line; clear: number }[],
  forbidden: readonly Ring[],
): Crowding {
  const buildings = new Map<string, Built[]>()
  const stretches = new Map<string, { line: Line; clear: number }[]>()
  const cellsAbout = (points: Line, margin: number): string[] => {
    const cells: string[] = []
    const low = (axis: 0 | 1) => Math.floor((Math.min(...points.map((p) => p[axis])) - margin) / CELL)
    const high = (axis: 0 | 1) => Math.floor((Math.max(...points.map((p) => p[axis])) + margin) / CELL)
    for (let x = low(0); x <= high(0); x += 1)
      for (let y = low(1); y <= high(1); y += 1) cells.push(`${x}/${y}`)
    return cells
  }
  const boxes = forbidden.map((ring) => ({
    ring,
    west: Math.min(...ring.map(([x]) => x)),
    east: Math.max(...ring.map(([x]) => x)),
    south: Math.min(...ring.map(([, y]) => y)),
    north: Math.max(...ring.map(([, y]) => y)),
  }))
  const put = <T>(map: Map<string, T[]>, cells: string[], value: T) =>
    cells.forEach((cell) => {
      const there = map.get(cell)
      if (there) there.push(value)
      else map.set(cell, [value])
    })
  for (const { line, clear } of roads)
    for (let at = 1; at < line.length; at += 1) {
      const stretch = [line[at - 1] as Point, line[at] as Point]
      put(stretches, cellsAbout(stretch, clear), { line: stretch, clear })
    }
  const probes = (ring: Ring, pitch: number): Point[] =>
    ring.flatMap(([x1, y1], at) => {
      const [x2, y2] = ring[(at + 1) % ring.length] as Point
      const pieces = Math.max(2, Math.ceil(Math.hypot(x2 - x1, y2 - y1) / pitch))
      return Array.from({ length: pieces }, (_, piece): Point => [
        x1 + ((x2 - x1) * piece) / pieces,
        y1 + ((y2 - y1) * piece) / pieces,
      ])
    })
  return {
    addBuilding: (ring) => put(buildings, cellsAbout(ring, 1), { ring, ...circleOf(ring) }),
    isFree: (ring) => {
      const { middle, radius } = circleOf(ring)
      const cells = cellsAbout(ring, 0)
      const touches = (other: Built) =>
        distance(middle, other.middle) < radius + other.radius && overlap(ring, other.ring)
      if (cells.some((cell) => buildings.get(cell)?.some(touches))) return false
      const [x, y] = middle
      const about = boxes.filter(
        (box) => x > box.west - CELL && x < box.east + CELL && y > box.south - CELL && y < box.north + CELL,
      )
      const corners = probes(ring, 1_000)
      if (corners.some((point) => about.some((box) => isInside(box.ring, point)))) return false
      const edge = probes(ring, 6)
      const near = new Set(cells.flatMap((cell) => stretches.get(cell) ?? []))
      for (const { line, clear } of near)
        if (
          distanceTo(line, middle) < radius + clear &&
          edge.some((point) => distanceTo(line, point) < clear)
        )
          return false
      return true
    },
  }
}
