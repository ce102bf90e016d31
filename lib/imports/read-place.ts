/** Where a home lies, from the columns that a list may have for it. */
import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { saysUnknown } from './fold-words'
import { gridReference } from './grid-reference'
import { type Place, placeOfGrid } from './osgb36'
import { found, type Reading, wrong } from './reading'

/** @source Ordnance Survey: the National Grid runs 700 km east and 1,300 km north of its false origin */
const MOST_EAST = 700_000
const MOST_NORTH = 1_300_000
/** A box round the United Kingdom and its waters [degrees; our judgement] */
const BOX = { south: 49, north: 61.5, west: -9, east: 2.5 } as const
/** The register keeps six decimals of a degree, about a tenth of a metre. */
const round = (degrees: number) => Math.round(degrees * 1e6) / 1e6

const numberOf = (cell: Cell): number | null | 'text' => {
  const text = cellText(cell)
    .replace(/,(?=\d{3}\b)/g, '')
    .replace(/\s*(?:m|mE|mN|°)$/i, '')
  if (saysUnknown(text)) return null
  return /^[+-]?\d+(?:\.\d+)?(?:e[+-]?\d+)?$/i.test(text) ? Number(text) : 'text'
}

type Pair = { first: number; second: number }

/** Both numbers of a pair, or null where both are missing or nought. */
function pairOf(one: Cell, other: Cell, names: readonly [string, string]): Reading<Pair | null> {
  if (isErrorCell(one) || isErrorCell(other)) return wrong('formula error')
  const [first, second] = [numberOf(one), numberOf(other)]
  if (first === 'text' || second === 'text') return wrong('not a number')
  if ((first ?? 0) === 0 && (second ?? 0) === 0) return found(null)
  if (first === null) return wrong(`${names[1]} without ${names[0]}`)
  if (second === null) return wrong(`${names[0]} without ${names[1]}`)
  return found({ first, second })
}

const placed = ({ latitude, longitude }: Place): Place => ({
  latitude: round(latitude),
  longitude: round(longitude),
})

/**
 * The place of an easting and a northing on the British National Grid [metres].
 * @example readGrid(651410, 313177) // { latitude: 52.657976, longitude: 1.716053 }
 */
export function readGrid(easting: Cell, northing: Cell): Reading<Place | null> {
  const pair = pairOf(easting, northing, ['easting', 'northing'])
  if (!pair.ok) return pair
  if (!pair.value) return found(null)
  const { first: east, second: north } = pair.value
  if (east > MOST_EAST && east <= MOST_NORTH && north >= 0 && north <= MOST_EAST)
    return wrong('easting and northing look swapped')
  // A point within a kilometre of the grid's corner is a number that lost its digits: it is open sea.
  if (east < 1000 || north < 1000 || east > MOST_EAST || north > MOST_NORTH)
    return wrong('outside Great Britain')
  return found(placed(placeOfGrid({ easting: east, northing: north })))
}

/**
 * The place of a grid reference with letters, or null where there is none.
 * @example readGridReference('TG 51409 13177') // { latitude: 52.657975, longitude: 1.716038 }
 */
export function readGridReference(cell: Cell): Reading<Place | null> {
  const text = cellText(cell)
  if (saysUnknown(text)) return found(null)
  const parts = /^(\d{5,6}(?:\.\d+)?)[\s,]+(\d{5,7}(?:\.\d+)?)$/.exec(text)
  if (parts) return readGrid(parts[1] ?? null, parts[2] ?? null)
  const point = gridReference(text)
  if (!point) return wrong('not a grid reference')
  return readGrid(point.easting, point.northing)
}

/** The place of a latitude and a longitude [degrees, WGS 84]. */
export function readLatitudeLongitude(latitude: Cell, longitude: Cell): Reading<Place | null> {
  const pair = pairOf(latitude, longitude, ['latitude', 'longitude'])
  if (!pair.ok) return pair
  if (!pair.value) return found(null)
  const { first: lat, second: lon } = pair.value
  const inside = (north: number, east: number) =>
    north >= BOX.south && north <= BOX.north && east >= BOX.west && east <= BOX.east
  if (inside(lat, lon)) return found(placed({ latitude: lat, longitude: lon }))
  return wrong(inside(lon, lat) ? 'latitude and longitude look swapped' : 'outside the United Kingdom')
}
