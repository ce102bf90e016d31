/** Names on the ground: those that there is room for at this zoom and in this part of the map. */
import { type Feature, type LineString, type Point } from 'geojson'
import L from 'leaflet'

/** kind of name: [first zoom, last zoom, look] */
const LOOKS: Record<string, readonly [from: number, to: number, look: string]> = {
  town: [10, 13, 'text-base font-bold text-ink'],
  isle: [10, 13, 'text-sm italic text-slate'],
  sea: [12, 15, 'text-sm italic text-blueprint'],
  water: [14, 18, 'text-xs italic text-blueprint'],
  district: [14, 16, 'text-sm font-semibold text-ink'],
  park: [15, 19, 'text-xs text-verdigris'],
  wood: [14, 19, 'text-xs text-verdigris'],
  pitch: [16, 19, 'text-xs text-verdigris'],
  allotment: [16, 19, 'text-xs text-verdigris'],
  marsh: [14, 19, 'text-xs text-verdigris'],
  beach: [14, 19, 'text-xs text-amber'],
}
const STREETS_FROM = 16
const MAIN_ROADS_FROM = 15
/** A name needs about so many pixels a letter. */
const LETTER = 6.6

type Placed = { at: L.LatLng; text: string; look: string; angle: number }

function nameIcon({ text, look, angle }: Placed): L.DivIcon {
  const name = document.createElement('span')
  name.textContent = text
  name.className = `map-name absolute whitespace-nowrap ${look}`
  name.style.transform = `translate(-50%, -50%) rotate(${angle.toFixed(1)}deg)`
  return L.divIcon({ html: name, className: '', iconSize: [0, 0] })
}

/** The longest stretch of a street, where its name has room: its middle and its slope on screen. */
function streetName(map: L.Map, feature: Feature): Placed | null {
  const { name, class: kind } = (feature.properties ?? {}) as { name?: string; class?: string }
  if (
    !name ||
    feature.geometry.type !== 'LineString' ||
    map.getZoom() < (kind === 'main' ? MAIN_ROADS_FROM : STREETS_FROM)
  )
    return null
  const points = (feature.geometry as LineString).coordinates.map(([longitude = 0, latitude = 0]) =>
    map.latLngToLayerPoint([latitude, longitude]),
  )
  let [length, best, from, to] = [0, 0, points[0], points[1]]
  for (let at = 1; at < points.length; at += 1) {
    const [a, b] = [points[at - 1] as L.Point, points[at] as L.Point]
    const step = a.distanceTo(b)
    length += step
    if (step > best) [best, from, to] = [step, a, b]
  }
  if (!from || !to || length < name.length * LETTER) return null
  const slope = (Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI
  return {
    at: map.layerPointToLatLng(from.add(to).divideBy(2)),
    text: name,
    look: 'text-xs text-ink',
    angle: slope > 90 ? slope - 180 : slope < -90 ? slope + 180 : slope,
  }
}

function placeName(map: L.Map, feature: Feature<Point>): Placed | null {
  const { kind, name } = feature.properties as { kind: string; name: string }
  const [from, to, look] = LOOKS[kind] ?? [99, 0, '']
  const [longitude = 0, latitude = 0] = feature.geometry.coordinates
  const zoom = map.getZoom()
  return zoom < from || zoom > to ? null : { at: L.latLng(latitude, longitude), text: name, look, angle: 0 }
}

/**
 * Writes names on a map and keeps them in step with it; decoration only, so that nothing reads them out.
 * @returns what takes them off
 */
export function addNames(
  map: L.Map,
  places: readonly Feature<Point>[],
  streets: readonly Feature[],
): () => void {
  const pane = map.getPane('names') ?? map.createPane('names')
  pane.style.zIndex = '450'
  pane.style.pointerEvents = 'none'
  pane.setAttribute('aria-hidden', 'true')
  const layer = L.layerGroup().addTo(map)
  const write = () => {
    layer.clearLayers()
    const view = map.getBounds().pad(0.05)
    const taken: { x: number; y: number; half: number }[] = []
    const wanted = [
      ...places.map((feature) => placeName(map, feature)),
      ...streets.toReversed().map((feature) => streetName(map, feature)),
    ]
    for (const name of wanted) {
      if (!name || !view.contains(name.at)) continue
      const { x, y } = map.latLngToLayerPoint(name.at)
      const half = (name.text.length * LETTER) / 2
      if (taken.some((other) => Math.abs(other.y - y) < 15 && Math.abs(other.x - x) < half + other.half))
        continue
      taken.push({ x, y, half })
      L.marker(name.at, { icon: nameIcon(name), pane: 'names', interactive: false, keyboard: false }).addTo(
        layer,
      )
    }
  }
  map.on('moveend zoomend', write)
  write()
  return () => {
    map.off('moveend zoomend', write)
    layer.remove()
  }
}
