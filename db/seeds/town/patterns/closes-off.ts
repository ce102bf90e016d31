import { seededRandom } from '../../seeded-random'
import { curveThrough, distanceTo, lengthOf, pointAlong } from '../line'
import { type Line, type Point, towards } from '../plane'
import { isInside, type Ring } from '../ring'

/**
 * Curved closes, left and right of the roads given, as far as there is room for them.
 * @param step between two closes along a road [metres]
 * @param reach of a close [metres], least and most
 * @param room that a close keeps to every other road [metres]
 */
export function closesOff(
  roads: readonly Line[],
  ring: Ring,
  taken: readonly Line[],
  { step, reach, room, seed }: { step: number; reach: readonly [number, number]; room: number; seed: string },
): Line[] {
  const random = seededRandom(seed)
  const closes: Line[] = []
  const boxes = new Map<Line, Box>()
  const isFar = (line: Line, point: Point) => {
    const box = boxes.get(line) ?? boxOf(line)
    boxes.set(line, box)
    const outside = Math.max(
      box.west - point[0],
      point[0] - box.east,
      box.south - point[1],
      point[1] - box.north,
    )
    return outside > room || distanceTo(line, point) > room
  }
  for (const road of roads) {
    const length = lengthOf(road)
    for (let along = step * 0.5; along < length - step * 0.3; along += step / 2) {
      const side = Math.round(along / (step / 2)) % 2 ? 1 : -1
      const { point, angle } = pointAlong(road, along + random.between(-6, 6))
      const bend = random.between(-0.55, 0.55)
      const full = random.between(...reach)
      for (const size of [full, full * 0.7, full * 0.45]) {
        const close = closeFrom(point, angle + (side * Math.PI) / 2, bend, size)
        const tail = close.slice(2)
        const others = [...taken.filter((one) => one !== road), ...closes]
        const fits =
          size >= 34 &&
          tail.every((at) => isInside(ring, at)) &&
          others.every((other) => tail.every((at) => isFar(other, at))) &&
          tail.slice(2).every((at) => distanceTo(road, at) > room * 0.8)
        if (!fits) continue
        closes.push(close)
        break
      }
    }
  }
  return closes
}

function closeFrom(start: Point, angle: number, bend: number, size: number): Point[] {
  const middle = towards(start, angle, size * 0.5)
  return curveThrough(
    [start, towards(start, angle, size * 0.2), middle, towards(middle, angle + bend, size * 0.5)],
    3,
  )
}

type Box = { west: number; east: number; south: number; north: number }
const boxOf = (line: Line): Box => ({
  west: Math.min(...line.map(([x]) => x)),
  east: Math.max(...line.map(([x]) => x)),
  south: Math.min(...line.map(([, y]) => y)),
  north: Math.max(...line.map(([, y]) => y)),
})
