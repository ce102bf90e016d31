/** The flat sheet that the town is drawn on: metres east and north of a point in the open sea. */

/** [metres east, metres north] of the middle of the sheet */
export type Point = readonly [number, number]
export type Line = readonly Point[]

/** The middle of the sheet: the North Sea, more than 100 km from the nearest land, so that nobody's home is meant. */
export const MIDDLE = { latitude: 54.6, longitude: 1.6 }

/** Everything drawn lies within this [degrees]; the sea around it is open too. */
export const SEA_BOX = { west: 1.48, south: 54.54, east: 1.7, north: 54.66 }

/** @source one degree of a meridian on a sphere of 6,371 km, which a town of 10 km cannot tell from the ellipsoid */
const METRES_A_DEGREE = (Math.PI * 6_371_000) / 180
const METRES_A_DEGREE_EAST = METRES_A_DEGREE * Math.cos((MIDDLE.latitude * Math.PI) / 180)

/**
 * Where a point of the sheet lies on the globe [degrees].
 * @example placeOf([0, 0]) // { latitude: 54.6, longitude: 1.6 }
 */
export const placeOf = ([east, north]: Point): { latitude: number; longitude: number } => ({
  latitude: MIDDLE.latitude + north / METRES_A_DEGREE,
  longitude: MIDDLE.longitude + east / METRES_A_DEGREE_EAST,
})

export const plus = (a: Point, b: Point): Point => [a[0] + b[0], a[1] + b[1]]
export const minus = (a: Point, b: Point): Point => [a[0] - b[0], a[1] - b[1]]
export const times = (a: Point, by: number): Point => [a[0] * by, a[1] * by]
export const distance = (a: Point, b: Point): number => Math.hypot(a[0] - b[0], a[1] - b[1])
export const between = (a: Point, b: Point, share: number): Point => plus(a, times(minus(b, a), share))

/** The point turned about another, anticlockwise [radians]. */
export function turned([x, y]: Point, angle: number, [cx, cy]: Point = [0, 0]): Point {
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)]
  return [cx + (x - cx) * cos - (y - cy) * sin, cy + (x - cx) * sin + (y - cy) * cos]
}

/** The point a distance away in a direction [radians, anticlockwise from east]. */
export const towards = (from: Point, angle: number, metres: number): Point =>
  plus(from, [Math.cos(angle) * metres, Math.sin(angle) * metres])

/** The direction from one point to another [radians, anticlockwise from east]. */
export const bearing = (from: Point, to: Point): number => Math.atan2(to[1] - from[1], to[0] - from[0])

/**
 * A line from text, a point after another.
 * @throws RangeError where a point is no pair of numbers
 * @example path('0,0 100,-40') // [[0, 0], [100, -40]]
 */
export function path(text: string): Point[] {
  return text
    .trim()
    .split(/\s+/)
    .map((pair) => {
      const [east, north, ...rest] = pair.split(',').map(Number)
      if (east === undefined || north === undefined || rest.length > 0 || !Number.isFinite(east + north))
        throw new RangeError(`Not a point: ${pair}`)
      return [east, north] as const
    })
}
