'use client'
import 'leaflet/dist/leaflet.css'
import './map.css'
import L from 'leaflet'
import { useEffect, useRef, useState } from 'react'
import { addGround, fetchGround, type Ground } from './ground-layers'
import { type Token, waterColour } from './ground-look'
import { showHomes } from './home-layers'
import { type Box, type Cluster, type HomesOnMap } from './homes-on-map'
import { MapButtons, type MapMove } from './map-buttons'
import { clusterPopup, homePopup } from './popups'

export type View = { readonly box: Box; readonly zoom: number }
/** Where the map is to go. `silent`: nobody's hand moved it, so the address of the page stays. */
export type Goal = { readonly box: Box; readonly silent: boolean }
export type Tiles = { readonly url: string; readonly attribution: string }

type Props = {
  homes: HomesOnMap | undefined
  /** a fresh object sends the map there again */
  goal: Goal | null
  tiles: Tiles | null
  /** the part on screen, whenever it has changed; `byHand` where a person moved it */
  onView: (view: View, byHand: boolean) => void
  onShowAll: () => void
  listHref: (box: Box) => string
}

const MOST_ZOOM = 19
const bounds = ([west, south, east, north]: Box): L.LatLngBoundsLiteral => [
  [south, west],
  [north, east],
]
const token: Token = (name) => getComputedStyle(document.documentElement).getPropertyValue(`--${name}`).trim()

function viewOf(map: L.Map): View {
  const box = map.getBounds()
  const round = (degrees: number) => Math.round(degrees * 100_000) / 100_000
  return {
    box: [round(box.getWest()), round(box.getSouth()), round(box.getEast()), round(box.getNorth())],
    zoom: map.getZoom(),
  }
}

/** The map itself. Leaflet draws it; this only tells it what. */
export default function MapSheet({ homes, goal, tiles, onView, onShowAll, listHref }: Props) {
  const holder = useRef<HTMLDivElement>(null)
  const [map, setMap] = useState<L.Map | null>(null)
  const [markers] = useState(() => L.layerGroup())
  const [theme, setTheme] = useState(0)
  const [groundFailed, setGroundFailed] = useState(false)
  const handlers = useRef({ onView, listHref })
  const silent = useRef(false)
  useEffect(() => {
    handlers.current = { onView, listHref }
  })

  useEffect(() => {
    if (!holder.current) return
    const calm = matchMedia('(prefers-reduced-motion: reduce)').matches
    const made = L.map(holder.current, {
      preferCanvas: true,
      zoomControl: false,
      attributionControl: false,
      maxZoom: MOST_ZOOM,
      minZoom: 3,
      zoomAnimation: !calm,
      fadeAnimation: !calm,
      markerZoomAnimation: !calm,
    })
    made.fitBounds(bounds([1.5, 54.56, 1.66, 54.63]))
    made.on('moveend', () => handlers.current.onView(viewOf(made), !silent.current))
    markers.addTo(made)
    setMap(made)
    return () => {
      setMap(null)
      made.remove()
    }
  }, [markers])

  useEffect(() => {
    const dark = matchMedia('(prefers-color-scheme: dark)')
    const changed = () => setTheme((count) => count + 1)
    dark.addEventListener('change', changed)
    return () => dark.removeEventListener('change', changed)
  }, [])

  useGround(map, tiles, theme, setGroundFailed)

  useEffect(() => {
    if (!map || !goal) return
    silent.current = goal.silent
    // not animated, so that the move is over when this returns
    map.fitBounds(bounds(goal.box), {
      padding: goal.silent ? [28, 28] : [60, 60],
      maxZoom: MOST_ZOOM - 1,
      animate: false,
    })
    silent.current = false
  }, [map, goal])

  useEffect(() => {
    if (!map || !homes) return
    const open = (at: L.LatLngTuple, content: HTMLElement) =>
      L.popup({ offset: [0, -12] })
        .setLatLng(at)
        .setContent(content)
        .openOn(map)
    const onCluster = (cluster: Cluster) => {
      const [west, south, east, north] = cluster.box
      const apart = Math.max(east - west, north - south) > 0.000_02
      if (apart && map.getZoom() < MOST_ZOOM)
        map.fitBounds(bounds(cluster.box), { padding: [60, 60], maxZoom: MOST_ZOOM })
      else
        open(
          [cluster.latitude, cluster.longitude],
          clusterPopup(cluster, handlers.current.listHref(cluster.box)),
        )
    }
    showHomes(markers, homes, token, {
      onCluster,
      onHome: (home) => open([home.latitude, home.longitude], homePopup(home)),
    })
  }, [map, markers, homes, theme])

  const move = (to: MapMove) => {
    if (!map) return
    if (to === 'all') return onShowAll()
    const { x, y } = map.getSize()
    const steps = { left: [-x / 3, 0], right: [x / 3, 0], up: [0, -y / 3], down: [0, y / 3] } as const
    if (to === 'in') map.zoomIn()
    else if (to === 'out') map.zoomOut()
    else map.panBy([...steps[to]])
  }

  return (
    <div className="relative size-full">
      <div
        ref={holder}
        role="group"
        aria-label="Map of homes. Arrow keys move it, plus and minus zoom it."
        className="size-full"
      />
      <MapButtons onMove={move} />
      <p className="pointer-events-none absolute right-0 bottom-0 z-[1000] bg-surface px-2 py-0.5 text-xs text-slate">
        {groundFailed
          ? 'The ground did not load; homes are drawn without it'
          : (tiles?.attribution ?? 'Invented town, drawn for Fuseward')}
      </p>
    </div>
  )
}

/** The ground: a tile server's where one is set, else the town that ships with the program. */
function useGround(
  map: L.Map | null,
  tiles: Tiles | null,
  theme: number,
  onFail: (failed: boolean) => void,
): void {
  const ground = useRef<Promise<Ground> | null>(null)
  useEffect(() => {
    if (!map) return
    map.getContainer().style.setProperty('--map-sea', waterColour(token))
    if (tiles) {
      const layer = L.tileLayer(tiles.url, { maxZoom: MOST_ZOOM, className: 'map-tiles' }).addTo(map)
      return () => void layer.remove()
    }
    let remove: (() => void) | undefined
    let gone = false
    ground.current ??= fetchGround()
    ground.current.then(
      (files) => {
        if (!gone) remove = addGround(map, files, token)
      },
      () => {
        ground.current = null
        if (!gone) onFail(true)
      },
    )
    return () => {
      gone = true
      remove?.()
    }
  }, [map, tiles, theme, onFail])
}
