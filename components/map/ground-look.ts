/** How the ground is drawn: every colour mixed from the program's own, every width in metres on the ground. */
import { type PathOptions } from 'leaflet'
import { mixColours } from './mix-colours'

/** Reads a colour token of the page, `paper` or `verdigris`: #RRGGBB. */
export type Token = (name: string) => string

export type RoadClass = 'main' | 'street' | 'lane' | 'close' | 'walk' | 'rail'

/** [metres, least pixels, first zoom at which it is drawn] */
const ROADS: Record<RoadClass, readonly [metres: number, least: number, from: number]> = {
  main: [11, 2, 0],
  street: [8, 1, 13],
  close: [7, 0.8, 14],
  lane: [5, 0.8, 13],
  walk: [1.8, 0.8, 15],
  rail: [3, 1.2, 0],
}
export const BUILDINGS_FROM = 14

/** Metres that a pixel covers. @source equator of 40,075,016.686 m over tiles of 256 px, shortened by the latitude */
export const metresAPixel = (zoom: number, latitude: number): number =>
  (40_075_016.686 * Math.cos((latitude * Math.PI) / 180)) / (256 * 2 ** zoom)

const HIDDEN: PathOptions = { stroke: false, fill: false }

/** Whether the page is dark: its paper is nearer to black than to white. */
const isDark = (token: Token) => mixColours(token('paper'), '#000000', 1) < '#80'

/** The open sea, and every other water: the blue of the drawings on its own wash. */
export const waterColour = (token: Token): string =>
  mixColours(
    mixColours(token('blueprint'), token('verdigris'), 0.5),
    token('blueprint-wash'),
    isDark(token) ? 0.04 : 0.17,
  )

/** An area of land, water or green by its kind. */
export function areaLook(kind: string, token: Token): PathOptions {
  const paper = token('paper')
  const mixed = (name: string, share: number) => mixColours(token(name), paper, share)
  const leaf = mixColours(token('verdigris'), token('amber'), 0.62)
  const green = (share: number) => mixColours(leaf, paper, share)
  const fill: Record<string, string> = {
    land: mixed('surface', 0.35),
    'built-up': mixed('plate', 0.45),
    water: waterColour(token),
    park: green(0.24),
    pitch: green(0.32),
    wood: green(0.4),
    allotment: green(0.16),
    field: green(0.08),
    marsh: mixColours(waterColour(token), green(0.3), 0.4),
    beach: mixed('amber', 0.2),
    pier: mixed('slate', 0.3),
  }
  const shore =
    kind === 'land' ? { stroke: true, color: mixed('blueprint', 0.35), weight: 1 } : { stroke: false }
  return { ...shore, fillColor: fill[kind] ?? paper, fillOpacity: 1 }
}

/** A road's edge (`casing`) or its surface. */
export function roadLook(
  kind: RoadClass,
  layer: 'casing' | 'surface',
  zoom: number,
  latitude: number,
  token: Token,
): PathOptions {
  const [metres, least, from] = ROADS[kind]
  if (zoom < from || (kind === 'rail' && layer === 'casing')) return HIDDEN
  const width = Math.max(least, metres / metresAPixel(zoom, latitude))
  const edge = mixColours(token('slate'), token('paper'), 0.34)
  if (kind === 'rail') return { color: token('slate'), weight: Math.max(1.2, width * 0.7), lineCap: 'butt' }
  if (kind === 'walk')
    return layer === 'casing'
      ? HIDDEN
      : { color: mixColours(token('slate'), token('paper'), 0.5), weight: 1.2, dashArray: '4 3' }
  if (layer === 'casing') return { color: edge, weight: width + (zoom < 15 ? 0.8 : 1.6), lineCap: 'round' }
  const plain = isDark(token) ? mixColours(token('slate'), token('paper'), 0.32) : token('surface')
  const surface = kind === 'main' ? mixColours(token('copper'), plain, 0.2) : plain
  return { color: surface, weight: width, lineCap: 'round' }
}

/** Buildings are stretches as thick as they are deep. */
export function buildingLook(
  kind: string,
  depth: number,
  zoom: number,
  latitude: number,
  token: Token,
): PathOptions {
  if (zoom < BUILDINGS_FROM) return HIDDEN
  const share = { house: 0.3, block: 0.45, landmark: 0.55 }[kind] ?? 0.3
  return {
    color: mixColours(token('edge'), token('paper'), share),
    weight: Math.max(1, depth / metresAPixel(zoom, latitude)),
    lineCap: 'butt',
  }
}
