/** Homes on the map, gathered by the database into the cells of a grid, so that a map of any size is one answer. */
import { BOARD_TYPES, type BoardType } from '@/lib/homes/board-type'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type InspectionRecord } from '@/lib/homes/standing'
import { type Scope } from '@/db/connection'
import { filtered, type HomeFilter } from './home-register-filter'

/** The size of a cell [degrees]. */
export type CellSize = { readonly longitude: number; readonly latitude: number }

/** The homes of one cell: where their middle is, where they end, how many, and the one home where there is but one. */
export type MapCell = {
  readonly longitude: number
  readonly latitude: number
  readonly west: number
  readonly south: number
  readonly east: number
  readonly north: number
  readonly homes: number
  readonly boards: Readonly<Record<BoardType, number>>
  readonly highestScore: number
  readonly homeId: string
}

const EACH_BOARD = BOARD_TYPES.map((board) => `sum(register.board_type = '${board}') as \`${board}\``).join(
  ', ',
)

/** The cells that hold homes of a filter, the fullest first; `limit` is a stop, not a page. */
export async function listCells(
  scope: Scope,
  filter: HomeFilter,
  cell: CellSize,
  limit: number,
): Promise<MapCell[]> {
  const rows = (await filtered(scope, filter)
    .whereNotNull('register.longitude')
    .whereNotNull('register.latitude')
    .groupByRaw('floor(register.longitude / ?), floor(register.latitude / ?)', [
      cell.longitude,
      cell.latitude,
    ])
    .orderBy('homes', 'desc')
    .limit(limit)
    .select(
      scope.db.raw(
        `avg(register.longitude) as longitude, avg(register.latitude) as latitude,
         min(register.longitude) as west, min(register.latitude) as south,
         max(register.longitude) as east, max(register.latitude) as north,
         count(*) as homes, ${EACH_BOARD},
         max(register.score) as highestScore, min(register.home_id) as homeId`,
      ),
    )) as unknown as (Omit<MapCell, 'boards'> & Record<BoardType, number>)[]
  return rows.map(({ rewireable, cartridge, breakers, rcbo, mixed, unknown, ...row }) => ({
    ...row,
    homes: Number(row.homes),
    boards: counts({ rewireable, cartridge, breakers, rcbo, mixed, unknown }),
  }))
}

const counts = (boards: Record<BoardType, number>) =>
  Object.fromEntries(BOARD_TYPES.map((board) => [board, Number(boards[board])])) as Record<BoardType, number>

export type MapPoint = {
  readonly id: string
  readonly address: string
  readonly longitude: number
  readonly latitude: number
  readonly boardType: BoardType
  readonly inspectionRecord: InspectionRecord
  readonly dueOn: CalendarDay | null
  readonly score: number
}

/** Single homes of a filter by their ids, as points. */
export async function listPoints(
  scope: Scope,
  filter: HomeFilter,
  ids: readonly string[],
): Promise<MapPoint[]> {
  if (ids.length === 0) return []
  return (await filtered(scope, filter)
    .join('homes as home', (on) =>
      on.on('home.organisation_id', 'register.organisation_id').andOn('home.id', 'register.home_id'),
    )
    .whereIn('register.home_id', [...ids])
    .select({
      id: 'register.home_id',
      address: 'home.address',
      longitude: 'register.longitude',
      latitude: 'register.latitude',
      boardType: 'register.board_type',
      inspectionRecord: 'register.inspection_record',
      dueOn: 'register.due_on',
      score: 'register.score',
    })) as unknown as MapPoint[]
}

/** How many homes of a filter have a place, how many have none, and the box that holds those that have one. */
export async function extent(
  scope: Scope,
  filter: HomeFilter,
): Promise<{
  placed: number
  unplaced: number
  box: [west: number, south: number, east: number, north: number] | null
}> {
  const row = (await filtered(scope, filter)
    .select(
      scope.db.raw(
        `count(register.longitude) as placed, count(*) - count(register.longitude) as unplaced,
         min(register.longitude) as west, min(register.latitude) as south,
         max(register.longitude) as east, max(register.latitude) as north`,
      ),
    )
    .first()) as Record<'placed' | 'unplaced', number> &
    Record<'west' | 'south' | 'east' | 'north', number | null>
  const { west, south, east, north } = row
  return {
    placed: Number(row.placed),
    unplaced: Number(row.unplaced),
    box:
      west === null || south === null || east === null || north === null ? null : [west, south, east, north],
  }
}
