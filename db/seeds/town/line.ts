/** Lines on the sheet: their length, points along them, and curves through a few points. */
import { bearing, between, distance, type Line, minus, plus, type Point, times, towards } from './plane'

export const lengthOf = (line: Line): number =>
  line.reduce((sum, point, at) => (at === 0 ? 0 : sum + distance(line[at - 1] as Point, point)), 0)

/** The point a distance along a line, and the line's direction there [radians]. */
export function pointAlong(line: Line, metres: number): { point: Point; angle: number } {
  let left = Math.max(0, metres)
  for (let at = 1; at < line.length; at += 1) {
    const [from, to] = [line[at - 1] as Point, line[at] as Point]
    const step = distance(from, to)
    if (left <= step || at === line.length - 1)
      return { point: between(from, to, step === 0 ? 0 : Math.min(1, left / step)), angle: bearing(from, to) }
    left -= step
  }
  throw new RangeError('A line has at least two points')
}

/** The part of a line between two distances along it. */
export function partOf(line: Line, from: number, to: number): Point[] {
  const part: Point[] = [pointAlong(line, from).point]
  let along = 0
  for (let at = 1; at < line.length - 1; at += 1) {
    along += distance(line[at - 1] as Point, line[at] as Point)
    if (along > from + 0.5 && along < to - 0.5) part.push(line[at] as Point)
  }
  return [...part, pointAlong(line, to).point]
}

/** A smooth curve through the points (Catmull-Rom), `steps` pieces between each two; `closed` joins the ends. */
export function curveThrough(points: Line, steps = 6, closed = false): Point[] {
  const count = points.length
  const at = (index: number) =>
    (closed ? points[(index + count) % count] : points[Math.min(count - 1, Math.max(0, index))]) as Point
  const curve: Point[] = []
  for (let index = 0; index < (closed ? count : count - 1); index += 1) {
    const [a, b, c, d] = [at(index - 1), at(index), at(index + 1), at(index + 2)]
    for (let step = 0; step < steps; step += 1) {
      const t = step / steps
      const sum = [
        times(b, 2),
        times(minus(c, a), t),
        times(plus(minus(times(a, 2), times(b, 5)), minus(times(c, 4), d)), t * t),
        times(plus(minus(times(b, 3), a), minus(d, times(c, 3))), t * t * t),
      ].reduce(plus)
      curve.push(times(sum, 0.5))
    }
  }
  return closed ? curve : [...curve, at(count - 1)]
}

/** Part of a circle, anticlockwise from one angle to another [radians], a point about every `pitch` metres. */
export function arc(centre: Point, radius: number, from: number, to: number, pitch = 14): Point[] {
  const pieces = Math.max(2, Math.ceil((Math.abs(to - from) * radius) / pitch))
  return Array.from({ length: pieces + 1 }, (_, at) =>
    towards(centre, from + ((to - from) * at) / pieces, radius),
  )
}

/** The outline of a line drawn with a width that may change from point to point. */
export function ribbon(line: Line, widthAt: (share: number) => number): Point[] {
  const sides = line.map((point, at) => {
    const angle = bearing(
      line[Math.max(0, at - 1)] as Point,
      line[Math.min(line.length - 1, at + 1)] as Point,
    )
    const half = widthAt(at / (line.length - 1)) / 2
    return [towards(point, angle + Math.PI / 2, half), towards(point, angle - Math.PI / 2, half)] as const
  })
  return [...sides.map(([left]) => left), ...sides.map(([, right]) => right).reverse()]
}

/** The shortest distance from a point to a line [metres]. */
export function distanceTo(line: Line, [x, y]: Point): number {
  let least = Infinity
  for (let at = 1; at < line.length; at += 1) {
    const [fromX, fromY] = line[at - 1] as Point
    const [toX, toY] = line[at] as Point
    const [dx, dy] = [toX - fromX, toY - fromY]
    const share = ((x - fromX) * dx + (y - fromY) * dy) / (dx * dx + dy * dy || 1)
    const near = share < 0 ? 0 : share > 1 ? 1 : share
    const [offX, offY] = [x - fromX - near * dx, y - fromY - near * dy]
    const square = offX * offX + offY * offY
    if (square < least) least = square
  }
  return Math.sqrt(least)
}
