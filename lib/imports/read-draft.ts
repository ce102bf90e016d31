/** One row read into a draft of a home: every field by its own reader, every problem put on record. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { waysOf } from '@/lib/electrical/consumer-unit'
import { type Nation } from '@/lib/homes/nation'
import { UNKNOWN_YEAR } from '@/lib/homes/year-built'
import { addressKey } from './address-key'
import { composeAddress } from './compose-address'
import { type HomeDraft, type ImportField } from './home-draft'
import { type Place } from './osgb36'
import { readAssessment } from './read-assessment'
import { readBedrooms } from './read-bedrooms'
import { readBoardType } from './read-board-type'
import { readCount } from './read-count'
import { readDwellingType, saysCommunal } from './read-dwelling-type'
import { readKind } from './read-kind'
import { readLastInspection } from './read-last-inspection'
import { readName } from './read-name'
import { readNation } from './read-nation'
import { readNextDue } from './read-next-due'
import { readGrid, readGridReference, readLatitudeLongitude } from './read-place'
import { readPostcode } from './read-postcode'
import { readRcdCover } from './read-rcd-cover'
import { readRewired } from './read-rewired'
import { readTenure } from './read-tenure'
import { readUprn } from './read-uprn'
import { readWiring } from './read-wiring'
import { readYearBuilt } from './read-year-built'
import { remembered } from './remembered'
import { type RowCells } from './row-cells'

/** What the register keeps of each [characters]. */
const LONGEST = { reference: 60, address: 200, town: 120, patch: 120, block: 160, note: 500 } as const

/** The readers of words, whose vocabulary is small. */
const words = {
  board: remembered(readBoardType),
  cover: remembered(readRcdCover),
  wiring: remembered(readWiring),
  tenure: remembered(readTenure),
  dwelling: remembered(readDwellingType),
  communal: remembered(saysCommunal),
  assessment: remembered(readAssessment),
} as const

export type DraftContext = { readonly today: CalendarDay; readonly nation: Nation }

const has = (cells: RowCells, field: ImportField) => cells.mapping[field] !== undefined

function readWays(cells: RowCells): string | null {
  const text = cells.text('ways').toUpperCase().replaceAll(' ', '')
  if (text === '') return null
  if (waysOf(text)) return text
  cells.problem('ways', 'noted', 'ways not understood')
  return null
}

function readWhere(cells: RowCells, kind: HomeDraft['kind']) {
  const name = (field: 'number' | 'block' | 'street' | 'address' | 'town', what: string, longest: number) =>
    cells.take(field, readName(cells.cell(field), what, longest), null)
  const block = name('block', 'block', LONGEST.block)
  const composed = composeAddress({
    block: block ?? '',
    number: name('number', 'house number', LONGEST.address) ?? '',
    street: name('street', 'street', LONGEST.address) ?? '',
    address: name('address', 'address', LONGEST.address + LONGEST.town) ?? '',
    town: name('town', 'town', LONGEST.town) ?? '',
  })
  const address = composed.address || (kind === 'communal' ? (block ?? '') : '')
  const field = has(cells, 'address') ? 'address' : has(cells, 'street') ? 'street' : null
  if (!cells.isRejected && !/\p{L}/u.test(address)) cells.problem(field, 'rejected', 'no address')
  if (address.length > LONGEST.address) cells.problem(field, 'rejected', 'address too long')
  const postcode = cells.take('postcode', readPostcode(cells.cell('postcode')), null) ?? composed.postcode
  return { block, address, town: composed.town?.slice(0, LONGEST.town) ?? null, postcode }
}

/** Latitude and longitude count before the grid; the Irish grid is not read, so a point on it is left out, with a note. */
function readPlace(cells: RowCells, nation: Nation): Place | null {
  const degrees = cells.take(
    'latitude',
    readLatitudeLongitude(cells.cell('latitude'), cells.cell('longitude')),
    null,
  )
  if (degrees) return degrees
  const onGrid = has(cells, 'easting') ? 'easting' : 'grid-reference'
  if (nation === 'northern-ireland') {
    if (cells.text(onGrid) !== '') cells.problem(onGrid, 'noted', 'Irish grid not read')
    return null
  }
  const metres = cells.take('easting', readGrid(cells.cell('easting'), cells.cell('northing')), null)
  return metres ?? cells.take('grid-reference', readGridReference(cells.cell('grid-reference')), null)
}

function readInspection(cells: RowCells, today: CalendarDay) {
  const last = cells.take('last-inspection', readLastInspection(cells.cell('last-inspection'), today), {
    record: 'unknown',
    date: null,
  })
  const nextDue = cells.take('next-due', readNextDue(cells.cell('next-due'), today, last.date !== null), null)
  if (nextDue && last.date && nextDue <= last.date.day)
    cells.problem('next-due', 'noted', 'next due before the inspection')
  const count = (field: ImportField) => cells.take(field, readCount(cells.cell(field)), null)
  return {
    inspectionRecord: last.record,
    lastInspection: last.date,
    assessment: cells.take('assessment', words.assessment(cells.cell('assessment')), null),
    nextDue,
    open: { C1: count('open-c1'), C2: count('open-c2'), C3: count('open-c3'), FI: count('open-fi') },
  }
}

function readInstallation(cells: RowCells, thisYear: number) {
  const { boardType, cover } = cells.take('board-type', words.board(cells.cell('board-type')), {
    boardType: 'unknown',
    cover: null,
  })
  return {
    boardType,
    rcdCover: has(cells, 'rcd-cover')
      ? cells.take('rcd-cover', words.cover(cells.cell('rcd-cover')), 'unknown')
      : (cover ?? 'unknown'),
    ways: readWays(cells),
    wiring: cells.take('wiring', words.wiring(cells.cell('wiring')), 'unknown'),
    rewired: cells.take('rewired', readRewired(cells.cell('rewired'), thisYear), null),
  }
}

function readNote(cells: RowCells): string | null {
  const text = cells.text('note')
  if (text.length > LONGEST.note) cells.problem('note', 'noted', `note cut to ${LONGEST.note} characters`)
  return text === '' ? null : text.slice(0, LONGEST.note)
}

/**
 * The draft of a row. Where `cells` has met a problem that rejects the row, the draft is not to be used.
 * @param row its number as the person sees it
 */
export function readDraft(row: number, cells: RowCells, { today, nation }: DraftContext): HomeDraft {
  const thisYear = Number(today.slice(0, 4))
  const communal = readKind(cells.cell('kind')) === 'communal' || words.communal(cells.cell('dwelling-type'))
  const kind = communal ? 'communal' : 'dwelling'
  const where = readWhere(cells, kind)
  const own = cells.take('nation', readNation(cells.cell('nation')), null)
  const place = readPlace(cells, own ?? nation)
  return {
    row,
    kind,
    reference: cells.take(
      'reference',
      readName(cells.cell('reference'), 'reference', LONGEST.reference),
      null,
    ),
    uprn: cells.take('uprn', readUprn(cells.cell('uprn')), null),
    ...where,
    addressKey: addressKey({ ...where, kind }),
    patch: cells.take('patch', readName(cells.cell('patch'), 'patch', LONGEST.patch), null),
    nation: own,
    tenure: cells.take('tenure', words.tenure(cells.cell('tenure')), 'unknown'),
    built: cells.take('built', readYearBuilt(cells.cell('built'), thisYear), UNKNOWN_YEAR),
    dwellingType: cells.take('dwelling-type', words.dwelling(cells.cell('dwelling-type')), 'unknown'),
    bedrooms: cells.take('bedrooms', readBedrooms(cells.cell('bedrooms')), null),
    ...readInstallation(cells, thisYear),
    ...readInspection(cells, today),
    latitude: place?.latitude ?? null,
    longitude: place?.longitude ?? null,
    note: readNote(cells),
  }
}
