/** Draws homes and clusters onto a map: as markers with their board while they are few, as dots where they are many. */
import L from 'leaflet'
import { type BoardType } from '@/lib/homes/board-type'
import { clusterInWords, homeInWords, MOST_MARKERS } from './feature-words'
import { type Token } from './ground-look'
import { type Cluster, type HomePoint, type HomesOnMap } from './homes-on-map'
import { clusterMarker, clusterWidth, homeMarker, MARKER_SIZE, svgText } from './marker-drawing'
import { ringOf, type ScoreRing } from './score-ring'

const icon = (html: string, width: number) =>
  L.divIcon({ html, className: 'map-marker', iconSize: [Math.max(MARKER_SIZE, width), MARKER_SIZE] })

const RADIUS: Record<ScoreRing, number> = { double: 8, single: 6, none: 4 }

/** Dots keep the difference without colour: filled, hollow, dashed. */
function dotLook(board: BoardType, token: Token): L.CircleMarkerOptions {
  if (board === 'unknown') return { color: token('blueprint'), dashArray: '2 2', fillColor: token('surface') }
  if (board === 'rewireable' || board === 'mixed')
    return { color: token('copper'), fillColor: token('copper') }
  return { color: token(board === 'rcbo' ? 'verdigris' : 'slate'), fillColor: token('surface') }
}

export type HomeHandlers = {
  readonly onHome: (home: HomePoint) => void
  readonly onCluster: (cluster: Cluster) => void
}

/**
 * Shows homes on a layer in the place of those that it showed before. Markers are for the pointer; the list beside the
 * map is for everybody.
 */
export function showHomes(
  layer: L.LayerGroup,
  homes: HomesOnMap,
  token: Token,
  { onHome, onCluster }: HomeHandlers,
): void {
  layer.clearLayers()
  const asDots = homes.points.length + homes.clusters.length > MOST_MARKERS
  const dots = L.canvas({ pane: 'overlayPane' })
  for (const cluster of homes.clusters) {
    const html = svgText(
      clusterMarker(cluster.homes, cluster.boards, ringOf(cluster.highestScore)),
      String(cluster.homes),
    )
    L.marker([cluster.latitude, cluster.longitude], {
      icon: icon(html, clusterWidth(cluster.homes)),
      keyboard: false,
      title: clusterInWords(cluster),
      zIndexOffset: 500,
    })
      .on('click', () => onCluster(cluster))
      .addTo(layer)
  }
  // the highest score lies on top
  for (const home of [...homes.points].sort((a, b) => a.score - b.score)) {
    const at: L.LatLngTuple = [home.latitude, home.longitude]
    const ring = ringOf(home.score)
    const marker = asDots
      ? L.circleMarker(at, {
          renderer: dots,
          radius: RADIUS[ring],
          weight: 2,
          fillOpacity: 1,
          ...dotLook(home.boardType, token),
        })
      : L.marker(at, {
          icon: icon(svgText(homeMarker(home.boardType, ring)), MARKER_SIZE),
          keyboard: false,
          title: homeInWords(home),
          zIndexOffset: Math.round(home.score),
        })
    marker.on('click', () => onHome(home)).addTo(layer)
  }
}
