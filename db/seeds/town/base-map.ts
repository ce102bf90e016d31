/** The town as GeoJSON (RFC 7946): what the map draws where no tile server is set. */
import { DISTRICTS } from './districts'
import { DOCK_LINE, RAILWAY } from './main-roads'
import { between, type Line, placeOf, type Point } from './plane'
import { areaOf, middleOf, type Ring } from './ring'
import { simplified } from './simplified'
import { type Town } from './town'

type Position = [number, number]
type Geometry =
  | { type: 'Point'; coordinates: Position }
  | { type: 'LineString'; coordinates: Position[] }
  | { type: 'MultiLineString'; coordinates: Position[][] }
  | { type: 'Polygon'; coordinates: Position[][] }
  | { type: 'MultiPolygon'; coordinates: Position[][][] }
type Feature = { type: 'Feature'; properties: Record<string, string | number>; geometry: Geometry }
export type FeatureCollection = { type: 'FeatureCollection'; features: Feature[] }

/** File name without its ending: what it holds. */
export type BaseMap = Readonly<Record<'ground' | 'streets' | 'buildings' | 'names', FeatureCollection>>

/** Longitude, latitude; five digits are a metre, six a hand's breadth. */
const position = (point: Point, digits: number): Position => {
  const { longitude, latitude } = placeOf(point)
  return [Number(longitude.toFixed(digits)), Number(latitude.toFixed(digits))]
}
const feature = (properties: Feature['properties'], geometry: Geometry): Feature => ({
  type: 'Feature',
  properties,
  geometry,
})
const collection = (features: Feature[]): FeatureCollection => ({ type: 'FeatureCollection', features })

/** Closed, and anticlockwise as RFC 7946 section 3.1.6 asks of an outer ring. */
function outer(ring: Ring, tolerance: number): Position[] {
  const closed = [...ring, ring[0] as Point]
  const half = Math.floor(closed.length / 2)
  const kept = [
    ...simplified(closed.slice(0, half + 1), tolerance),
    ...simplified(closed.slice(half), tolerance).slice(1),
  ]
  return (areaOf(ring) < 0 ? kept.reverse() : kept).map((point) => position(point, 5))
}

const many = (kind: string, rings: readonly Ring[], tolerance = 0.7): Feature =>
  feature({ kind }, { type: 'MultiPolygon', coordinates: rings.map((ring) => [outer(ring, tolerance)]) })

const line = (points: Line): Geometry => ({
  type: 'LineString',
  coordinates: simplified(points, 0.6).map((point) => position(point, 5)),
})

function groundOf(town: Town): FeatureCollection {
  const { land, water, piers, greens } = town.ground
  const kinds = [...new Set(greens.map(({ kind }) => kind))]
  return collection([
    many('land', land),
    ...kinds
      .toSorted((a, b) => Number(b === 'field') - Number(a === 'field'))
      .map((kind) =>
        many(
          kind,
          greens.filter((one) => one.kind === kind).map(({ ring }) => ring),
        ),
      ),
    many(
      'built-up',
      DISTRICTS.filter(({ name }) => name !== 'Aberllinos').map(({ ring }) => ring),
    ),
    ...greens.filter(({ kind }) => kind === 'park').map(({ ring }) => many('park', [ring])),
    many('water', water),
    many('pier', piers),
  ])
}

function streetsOf(town: Town): FeatureCollection {
  const order = ['walk', 'lane', 'close', 'street', 'main']
  return collection([
    feature({ class: 'rail' }, line(RAILWAY)),
    feature({ class: 'rail' }, line(DOCK_LINE)),
    ...[...town.streets]
      .sort((a, b) => order.indexOf(a.class) - order.indexOf(b.class))
      .map((street) =>
        feature({ class: street.class, ...(street.name && { name: street.name }) }, line(street.line)),
      ),
  ])
}

/**
 * A building is a stretch drawn as thick as it is deep: two positions instead of five, so that the whole town is light.
 * One feature a depth [whole metres].
 */
function buildingsOf(town: Town): FeatureCollection {
  const rings: [kind: string, ring: Ring][] = [
    ...town.buildings.map(({ ring }): [string, Ring] => ['house', ring]),
    ...town.blocks.map(({ ring }): [string, Ring] => ['block', ring]),
    ...town.landmarks.map((ring): [string, Ring] => ['landmark', ring]),
  ]
  const groups = new Map<string, Position[][]>()
  for (const [kind, ring] of rings) {
    const [a, b, c, d] = ring as [Point, Point, Point, Point]
    const depth = Math.round(Math.hypot(d[0] - a[0], d[1] - a[1]))
    const key = `${kind} ${depth}`
    groups.set(key, [
      ...(groups.get(key) ?? []),
      [position(between(a, d, 0.5), 6), position(between(b, c, 0.5), 6)],
    ])
  }
  return collection(
    [...groups].map(([key, coordinates]) => {
      const [kind = '', depth] = key.split(' ')
      return feature({ kind, depth: Number(depth) }, { type: 'MultiLineString', coordinates })
    }),
  )
}

function namesOf(town: Town): FeatureCollection {
  const point = (kind: string, name: string, at: Point) =>
    feature({ kind, name }, { type: 'Point', coordinates: position(at, 5) })
  return collection([
    point('town', 'Larrowmouth', [-60, -60]),
    point('sea', 'Larrow Roads', [700, -1250]),
    point('sea', 'The Swash', [-3300, 1700]),
    point('water', 'River Larrow', [-870, 1190]),
    point('water', 'Harbour', [150, -620]),
    point('isle', 'Larrow', [-300, 1700]),
    point('isle', 'Ynys Llinos', [-4750, 2450]),
    ...DISTRICTS.map(({ name, label }) => point('district', name, label)),
    ...town.ground.greens.flatMap(({ kind, name, ring }) =>
      name ? [point(kind, name, middleOf(ring))] : [],
    ),
  ])
}

/** Everything that is drawn under the homes. */
export const baseMap = (town: Town): BaseMap => ({
  ground: groundOf(town),
  streets: streetsOf(town),
  buildings: buildingsOf(town),
  names: namesOf(town),
})
