/** The columns of an exported list: what each is headed, and what stands in it. */
import { type PartialDate } from '@/lib/calendar/partial-date'
import { BOARD_TYPE_NAMES } from '@/lib/homes/board-type'
import { DWELLING_TYPE_NAMES } from '@/lib/homes/dwelling-type'
import { type Column, COLUMNS } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { NATION_NAMES } from '@/lib/homes/nation'
import { RCD_COVER_NAMES } from '@/lib/homes/rcd-cover'
import { TENURE_NAMES } from '@/lib/homes/tenure'
import { WIRING_NAMES } from '@/lib/homes/wiring'
import { yearBuiltInWords } from '@/lib/homes/year-built'

type Cell = string | number | null
type Exported = readonly (readonly [heading: string, cell: (home: HomeRow) => Cell])[]

/** ISO 8601, no further than it is known, so that a spreadsheet sorts it. */
const partialDate = (date: PartialDate | null): string | null =>
  date && date.day.slice(0, { day: 10, month: 7, year: 4 }[date.precision])

const rounded = (score: number) => Math.round(score * 10) / 10

const ALWAYS: Exported = [
  ['Reference', (home) => home.reference],
  // as text: a spreadsheet shows twelve digits as 1E+11 otherwise
  ['UPRN', (home) => home.uprn],
  ['Address', (home) => home.address],
  ['Town', (home) => home.town],
  ['Postcode', (home) => home.postcode],
]

const OF_COLUMN: Record<Column, Exported> = {
  board: [
    ['Consumer unit', (home) => BOARD_TYPE_NAMES[home.boardType]],
    ['Ways', (home) => home.ways],
  ],
  cover: [['RCD cover', (home) => RCD_COVER_NAMES[home.rcdCover]]],
  built: [['Built', (home) => yearBuiltInWords(home.built)]],
  inspected: [
    [
      'Last inspection',
      (home) => (home.inspectionRecord === 'never' ? 'never' : partialDate(home.inspectedOn)),
    ],
    ['Assessment', (home) => home.assessment],
  ],
  standing: [
    ['Standing', (home) => home.standing],
    ['Next due', (home) => home.dueOn],
  ],
  defects: [
    ['Open C1', (home) => home.open.C1],
    ['Open C2', (home) => home.open.C2],
    ['Open C3', (home) => home.open.C3],
    ['Open FI', (home) => home.open.FI],
  ],
  score: [
    ['Score', (home) => rounded(home.score)],
    ['Score, low', (home) => rounded(home.scoreLow)],
    ['Score, high', (home) => rounded(home.scoreHigh)],
  ],
  patch: [['Patch', (home) => home.patch?.name ?? null]],
  block: [['Block', (home) => home.block?.name ?? null]],
  tenure: [['Tenure', (home) => TENURE_NAMES[home.tenure]]],
  type: [
    [
      'Dwelling',
      (home) => (home.kind === 'communal' ? 'Landlord supply' : DWELLING_TYPE_NAMES[home.dwellingType]),
    ],
  ],
  wiring: [['Wiring', (home) => WIRING_NAMES[home.wiring]]],
  rewired: [['Rewired', (home) => home.rewired]],
  bedrooms: [['Bedrooms', (home) => home.bedrooms]],
  reference: [],
  uprn: [],
  nation: [['Nation', (home) => NATION_NAMES[home.nation]]],
}

/** What always stands there, then the chosen columns in the order of the list. */
const exported = (columns: readonly Column[]): Exported => [
  ...ALWAYS,
  ...COLUMNS.filter((column) => columns.includes(column)).flatMap((column) => OF_COLUMN[column]),
]

export const exportHeadings = (columns: readonly Column[]): string[] =>
  exported(columns).map(([heading]) => heading)

export const exportCells = (home: HomeRow, columns: readonly Column[]): Cell[] =>
  exported(columns).map(([, cell]) => cell(home))
