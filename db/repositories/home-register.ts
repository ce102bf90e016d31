/** The derived row of each home, which lists, maps, counts and exports read. Written by refresh-homes alone. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Precision } from '@/lib/calendar/partial-date'
import { type HomeRow } from '@/lib/homes/home-row'
import { type WritingScope } from '@/db/connection'
import { addressSortOf, searchTextOf } from './home-register-search'
import { type Home } from './homes'
import { insertRows, type Value } from './insert-rows'

/** What is derived of a home, beside what the home itself says. */
export type Derived = Pick<
  HomeRow,
  | 'boardType'
  | 'rcdCover'
  | 'ways'
  | 'wiring'
  | 'dwellingType'
  | 'built'
  | 'rewired'
  | 'bedrooms'
  | 'inspectionRecord'
  | 'inspectedOn'
  | 'assessment'
  | 'dueOn'
  | 'open'
  | 'score'
  | 'scoreLow'
  | 'scoreHigh'
>

/** Each column with what fills it. */
const FILLED: readonly (readonly [string, (home: Home, derived: Derived) => Value])[] = [
  ['home_id', (home) => home.id],
  ['kind', (home) => home.kind],
  ['address_sort', (home) => addressSortOf(home.address, home.town)],
  ['search_text', (home) => searchTextOf(home)],
  ['patch_id', (home) => home.patchId],
  ['block_id', (home) => home.blockId],
  ['nation', (home) => home.nation],
  ['tenure', (home) => home.tenure],
  ['latitude', (home) => home.latitude],
  ['longitude', (home) => home.longitude],
  ['board_type', (_, derived) => derived.boardType],
  ['rcd_cover', (_, derived) => derived.rcdCover],
  ['ways', (_, derived) => derived.ways],
  ['wiring', (_, derived) => derived.wiring],
  ['dwelling_type', (_, derived) => derived.dwellingType],
  ['built_from', (_, derived) => derived.built.from],
  ['built_to', (_, derived) => derived.built.to],
  ['built_about', (_, derived) => derived.built.about],
  ['rewired', (_, derived) => derived.rewired],
  ['bedrooms', (_, derived) => derived.bedrooms],
  ['inspection_record', (_, derived) => derived.inspectionRecord],
  ['inspected_on', (_, derived) => derived.inspectedOn?.day ?? null],
  ['inspected_precision', (_, derived) => derived.inspectedOn?.precision ?? null],
  ['assessment', (_, derived) => derived.assessment],
  ['due_on', (_, derived) => derived.dueOn],
  ['open_c1', (_, derived) => derived.open.C1],
  ['open_c2', (_, derived) => derived.open.C2],
  ['open_c3', (_, derived) => derived.open.C3],
  ['open_fi', (_, derived) => derived.open.FI],
  ['score', (_, derived) => derived.score],
  ['score_low', (_, derived) => derived.scoreLow],
  ['score_high', (_, derived) => derived.scoreHigh],
]
const COLUMNS = ['organisation_id', ...FILLED.map(([column]) => column)]
const REPLACE = `on duplicate key update ${FILLED.slice(1)
  .map(([column]) => `\`${column}\`=values(\`${column}\`)`)
  .join(',')}, refreshed_at=current_timestamp(3)`

/** Writes the derived rows of homes, new or not. */
export async function upsertMany(
  scope: WritingScope,
  rows: readonly { readonly home: Home; readonly derived: Derived }[],
): Promise<void> {
  const values = rows.map(({ home, derived }): Value[] => [
    scope.organisationId,
    ...FILLED.map(([, fill]) => fill(home, derived)),
  ])
  await insertRows(scope.db, 'home_register', COLUMNS, values, REPLACE)
}

/** A row of the register as the database holds it, with the names that it is shown with. */
export type RegisterRow = {
  home_id: string
  kind: HomeRow['kind']
  reference: string | null
  uprn: number | null
  address: string
  town: string | null
  postcode: string | null
  patch_id: string | null
  patch_name: string | null
  block_id: string | null
  block_name: string | null
  nation: HomeRow['nation']
  tenure: HomeRow['tenure']
  board_type: HomeRow['boardType']
  rcd_cover: HomeRow['rcdCover']
  ways: string | null
  wiring: HomeRow['wiring']
  dwelling_type: HomeRow['dwellingType']
  built_from: number | null
  built_to: number | null
  built_about: number
  rewired: number | null
  bedrooms: number | null
  inspection_record: HomeRow['inspectionRecord']
  inspected_on: CalendarDay | null
  inspected_precision: Precision | null
  assessment: HomeRow['assessment']
  due_on: CalendarDay | null
  open_c1: number
  open_c2: number
  open_c3: number
  open_fi: number
  score: number
  score_low: number
  score_high: number
  latitude: number | null
  longitude: number | null
}

/** A home as lists show it, but for its standing, which depends on the day. */
export type RegisteredHome = Omit<HomeRow, 'standing'>

export const toRegisteredHome = (row: RegisterRow): RegisteredHome => ({
  id: row.home_id,
  kind: row.kind,
  reference: row.reference,
  uprn: row.uprn === null ? null : String(row.uprn),
  address: row.address,
  town: row.town,
  postcode: row.postcode,
  patch: row.patch_id === null ? null : { id: row.patch_id, name: row.patch_name ?? '' },
  block: row.block_id === null ? null : { id: row.block_id, name: row.block_name ?? '' },
  nation: row.nation,
  tenure: row.tenure,
  built: { from: row.built_from, to: row.built_to, about: row.built_about === 1 },
  dwellingType: row.dwelling_type,
  bedrooms: row.bedrooms,
  boardType: row.board_type,
  rcdCover: row.rcd_cover,
  ways: row.ways,
  wiring: row.wiring,
  rewired: row.rewired,
  inspectionRecord: row.inspection_record,
  inspectedOn:
    row.inspected_on === null ? null : { day: row.inspected_on, precision: row.inspected_precision ?? 'day' },
  assessment: row.assessment,
  dueOn: row.due_on,
  open: { C1: row.open_c1, C2: row.open_c2, C3: row.open_c3, FI: row.open_fi },
  score: row.score,
  scoreLow: row.score_low,
  scoreHigh: row.score_high,
  place:
    row.latitude === null || row.longitude === null
      ? null
      : { latitude: row.latitude, longitude: row.longitude },
})
