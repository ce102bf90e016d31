import { z } from 'zod'
import { reading } from '@/db/connection'
import {
  type CellSize,
  listCells,
  listPoints,
  type MapCell,
  extent,
} from '@/db/repositories/home-register-map'
import * as organisations from '@/db/repositories/organisations'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { standingOf } from '@/lib/duties/standing-of'
import { type BoardType } from '@/lib/homes/board-type'
import { type HomeQuery } from '@/lib/homes/home-query'
import { type Standing } from '@/lib/homes/standing'
import { filterFor } from '@/lib/use-cases/homes/filter-for'

/** West, south, east, north [degrees]. */
export type Box = readonly [west: number, south: number, east: number, north: number]

const text = z.string().transform((given) => given.split(',').map(Number))
const degrees = (most: number) => z.number().min(-most).max(most)

/** What part of the map is on screen, as a query sends it: `box=west,south,east,north&zoom=14`. */
export const MapView = z.object({
  box: text
    .pipe(z.tuple([degrees(180), degrees(90), degrees(180), degrees(90)], 'The box needs four numbers.'))
    .refine(([west, south, east, north]) => west <= east && south <= north, 'The box is upside down.'),
  zoom: z.coerce
    .number('The zoom is a number.')
    .min(0, 'The zoom starts at 0.')
    .max(22, 'The zoom ends at 22.'),
})

export type MapCluster = {
  /** where its homes' middle is */
  readonly longitude: number
  readonly latitude: number
  /** what holds all of its homes: zoom to it, or list the homes `within` it */
  readonly box: Box
  readonly homes: number
  readonly boards: Readonly<Record<BoardType, number>>
  readonly highestScore: number
}

export type MapHome = {
  readonly id: string
  readonly address: string
  readonly longitude: number
  readonly latitude: number
  readonly boardType: BoardType
  readonly standing: Standing
  readonly score: number
}

export type HomesOnMap = {
  readonly clusters: readonly MapCluster[]
  readonly points: readonly MapHome[]
  /** homes of the query in this box, homes of it that have a place, and homes of it that have none */
  readonly inBox: number
  readonly placed: number
  readonly unplaced: number
  /** what holds every home of the query that has a place */
  readonly extent: Box | null
}

/** A cell is a quarter of a map tile of 256 pixels, so clusters lie about 64 pixels apart. */
const CELLS_A_TILE = 4
/** Cells across the box at most: 40 by 40, so an answer stays under 2,000 features whatever box is asked for. */
const MOST_ACROSS = 40
/** A degree of longitude is this part of a degree of latitude, near enough, between 50 and 60 degrees north. */
const SHORTENED = 0.58
/** From this zoom on, homes stand apart unless they share a place. */
const STREET_ZOOM = 17
const SMALLEST_CELL = 0.000_02

/** The grid's cells are fixed to the ground, so that clusters stay where they are while the map is moved. */
function cellFor([west, south, east, north]: Box, zoom: number): CellSize {
  const fine = zoom >= STREET_ZOOM ? SMALLEST_CELL : 360 / 2 ** Math.floor(zoom) / CELLS_A_TILE
  const needed = Math.max((east - west) / MOST_ACROSS, (north - south) / SHORTENED / MOST_ACROSS)
  // Doubling keeps coarser cells on the lines of the finer ones.
  const longitude = fine * 2 ** Math.max(0, Math.ceil(Math.log2(needed / fine)))
  return { longitude, latitude: longitude * SHORTENED }
}

const overlap = (a: Box, b: Box | undefined): Box =>
  b ? [Math.max(a[0], b[0]), Math.max(a[1], b[1]), Math.min(a[2], b[2]), Math.min(a[3], b[3])] : a

const toCluster = ({
  longitude,
  latitude,
  west,
  south,
  east,
  north,
  homes,
  boards,
  highestScore,
}: MapCell): MapCluster => ({
  longitude,
  latitude,
  box: [west, south, east, north],
  homes,
  boards,
  highestScore,
})

/**
 * The homes of a query in one part of the map: clusters by the cells of a grid, and single homes where a cell
 * has but one. The answer is under 2,000 features, however many homes there are. Four statements at most.
 */
export async function mapHomes(
  actor: Actor,
  { query, box, zoom }: { query: HomeQuery; box: Box; zoom: number },
  today: CalendarDay,
): Promise<HomesOnMap> {
  demand(actor, 'homes.read')
  const scope = reading(actor)
  const { noticeDays } = await organisations.get(scope)
  const whole = filterFor(actor, query, today, noticeDays)
  const seen = {
    ...whole,
    query: { ...query, within: [...overlap(box, query.within)] as [number, number, number, number] },
  }
  const [all, cells] = await Promise.all([
    extent(scope, whole),
    listCells(scope, seen, cellFor(box, zoom), MOST_ACROSS * MOST_ACROSS + 2 * MOST_ACROSS + 1),
  ])
  const points = await listPoints(
    scope,
    seen,
    cells.flatMap((cell) => (cell.homes === 1 ? [cell.homeId] : [])),
  )
  return {
    clusters: cells.filter((cell) => cell.homes > 1).map(toCluster),
    points: points.map(({ inspectionRecord, dueOn, ...home }) => ({
      ...home,
      standing: standingOf({ record: inspectionRecord, dueOn, today, noticeDays }),
    })),
    inBox: cells.reduce((sum, cell) => sum + cell.homes, 0),
    placed: all.placed,
    unplaced: all.unplaced,
    extent: all.box,
  }
}
