/** Draws the ground that ships with the program onto a map, and keeps it in step with zoom and theme. */
import { type Feature, type FeatureCollection, type Point } from 'geojson'
import L from 'leaflet'
import { areaLook, buildingLook, type RoadClass, roadLook, type Token } from './ground-look'
import { addNames } from './ground-names'

export type Ground = Readonly<Record<'ground' | 'streets' | 'buildings' | 'names', FeatureCollection>>

const FILES = ['ground', 'streets', 'buildings', 'names'] as const

/** Fetches the ground's files. @throws Error where one is not there */
export async function fetchGround(): Promise<Ground> {
  const read = async (name: string) => {
    const response = await fetch(`/base-map/${name}.geojson`)
    if (!response.ok) throw new Error(`The ground of the map did not come: ${name}, ${response.status}`)
    return [name, (await response.json()) as FeatureCollection] as const
  }
  return Object.fromEntries(await Promise.all(FILES.map(read))) as Ground
}

const property = (feature: Feature | undefined, name: string) => String(feature?.properties?.[name] ?? '')

/**
 * Puts the ground on a map.
 * @returns what takes it off and stops it
 */
export function addGround(map: L.Map, ground: Ground, token: Token): () => void {
  const pane = map.getPane('ground') ?? map.createPane('ground')
  pane.style.zIndex = '200'
  const renderer = L.canvas({ pane: 'ground', padding: 0.35 })
  const drawn = (collection: FeatureCollection, look: (feature?: Feature) => L.PathOptions) =>
    L.geoJSON(collection, {
      pane: 'ground',
      interactive: false,
      style: look,
      renderer,
    } as L.GeoJSONOptions & {
      renderer: L.Renderer
    })
  const roads = (layer: 'casing' | 'surface') => (feature?: Feature) =>
    roadLook(property(feature, 'class') as RoadClass, layer, map.getZoom(), map.getCenter().lat, token)
  const buildings = (feature?: Feature) =>
    buildingLook(
      property(feature, 'kind'),
      Number(property(feature, 'depth')),
      map.getZoom(),
      map.getCenter().lat,
      token,
    )

  const areas = drawn(ground.ground, (feature) => areaLook(property(feature, 'kind'), token))
  const casing = drawn(ground.streets, roads('casing'))
  const built = drawn(ground.buildings, buildings)
  const surface = drawn(ground.streets, roads('surface'))
  const layers = [areas, casing, surface, built]
  for (const layer of layers) layer.addTo(map)
  const restyle = () => {
    casing.setStyle(roads('casing'))
    surface.setStyle(roads('surface'))
    built.setStyle(buildings)
  }
  const removeNames = addNames(map, ground.names.features as Feature<Point>[], ground.streets.features)
  map.on('zoomend', restyle)
  return () => {
    map.off('zoomend', restyle)
    removeNames()
    for (const layer of layers) layer.remove()
    renderer.remove()
  }
}
