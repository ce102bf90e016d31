/**
 * Fills an organisation with invented homes, fast, for the benchmark and for tests of scale. The same seed gives
 * the same homes (but for their ids). Shares are ours, set so that every filter has something to find.
 */
import { inTransaction, type WritingScope } from '@/db/connection'
import * as blocks from '@/db/repositories/blocks'
import * as defects from '@/db/repositories/defects'
import * as homeFacts from '@/db/repositories/home-facts'
import * as homes from '@/db/repositories/homes'
import * as inspections from '@/db/repositories/inspections'
import * as patches from '@/db/repositories/patches'
import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay, calendarDay, dayOf, partsOf } from '@/lib/calendar/calendar-day'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { type FactKind } from '@/lib/homes/fact'
import { type Tenure } from '@/lib/homes/tenure'
import { addressKey } from '@/lib/imports/address-key'
import { newId } from '@/lib/platform/new-id'
import { chance } from './chance'

const FIRST =
  'Herring Lantern Copper Saltmarsh Anchor Bramble Tallow Fennel Osprey Pebble Quarry Rushy Sable Thistle Willow Mallard'.split(
    ' ',
  )
const LAST = 'Row Street Lane Close Road Gardens Court Terrace Way Place Walk Hill'.split(' ')
const TOWNS = ['Quillhaven', 'Marram Bay', 'Tollgate Green', 'Osier Ferry']
const LETTERS = 'ABDEFGHJLNPQRSTUWXYZ'
const NUMBERS_A_STREET = 160
const HOMES_A_PART = 2_000

type Pick = ReturnType<typeof chance>

const weighted = <T>(pick: Pick, table: readonly (readonly [T, number])[]): T => {
  let left = pick.fraction() * table.reduce((sum, [, weight]) => sum + weight, 0)
  for (const [value, weight] of table) if ((left -= weight) < 0) return value
  return (table.at(-1) as readonly [T, number])[0]
}

const BOARDS = [
  ['rewireable', 22],
  ['mixed', 2],
  ['cartridge', 7],
  ['breakers', 42],
  ['rcbo', 12],
  [null, 15],
] as const
const COVERS = [
  ['none', 30],
  ['sockets', 22],
  ['part', 10],
  ['all', 20],
  [null, 18],
] as const
const WIRINGS = [
  ['pvc', 70],
  ['rubber', 5],
  ['lead', 1],
  ['mineral', 1],
  ['mixed', 3],
  [null, 20],
] as const
const DWELLINGS = [
  ['flat', 40],
  ['mid-terrace', 22],
  ['semi-detached', 16],
  ['end-terrace', 8],
  ['bungalow', 6],
  ['maisonette', 5],
  ['bedsit', 1],
  [null, 2],
] as const
const TENURES: readonly (readonly [Tenure, number])[] = [
  ['social-rent', 78],
  ['affordable-rent', 12],
  ['leasehold', 5],
  ['shared-ownership', 2],
  ['unknown', 3],
]
const RECORDS = [
  ['dated', 88],
  ['never', 4],
  ['unknown', 8],
] as const
const PRECISIONS = [
  ['day', 88],
  ['month', 8],
  ['year', 4],
] as const
const WAYS = {
  rewireable: ['RRRR', 'RRRRR', 'RRRRRR'],
  mixed: ['RRR[BB]', 'RRRRB'],
  cartridge: ['CCCC'],
  breakers: ['BBBBBB', '[BBBB]BB', '[BBBBBB]'],
  rcbo: ['OOOOOO'],
} as const

function homeAt(
  pick: Pick,
  at: number,
  places: { patches: readonly string[]; blocks: readonly string[] },
): homes.Home {
  const streetAt = Math.floor(at / NUMBERS_A_STREET)
  const number = 1 + (at % NUMBERS_A_STREET)
  const street = `${FIRST[streetAt % FIRST.length]} ${LAST[Math.floor(streetAt / FIRST.length) % LAST.length]}`
  const town = TOWNS[Math.floor(streetAt / (FIRST.length * LAST.length)) % TOWNS.length] ?? 'Quillhaven'
  const inBlock = streetAt % 4 === 0
  const address = inBlock
    ? `Flat ${1 + (number % 20)}, ${1 + Math.floor(number / 20)} ${street}`
    : `${number} ${street}`
  const letter = (n: number) => LETTERS[n % LETTERS.length]
  const postcode = `ZX${1 + (streetAt % 40)} ${Math.floor(number / 20) % 10}${letter(streetAt)}${letter(Math.floor(streetAt / 20))}`
  const patch = places.patches[Math.floor(streetAt / 4) % places.patches.length] ?? null
  return {
    id: newId(),
    kind: 'dwelling',
    reference: `QH-${String(at + 1).padStart(6, '0')}`,
    uprn: String(990_000_000_000 + at * 7),
    address,
    town,
    postcode,
    addressKey: addressKey({ address, town, postcode, kind: 'dwelling' }),
    nation: 'england',
    tenure: weighted(pick, TENURES),
    patchId: pick.fraction() < 0.01 ? null : patch,
    blockId: inBlock ? (places.blocks[(streetAt / 4) % places.blocks.length] ?? null) : null,
    // at sea, so that nobody's home is meant
    latitude: 53.4 + (streetAt % 64) * 0.0015 + pick.fraction() * 0.001,
    longitude: 0.9 + Math.floor(streetAt / 64) * 0.012 + number * 0.00006,
    note: null,
  }
}

function factsOf(pick: Pick, home: homes.Home, today: CalendarDay): homeFacts.NewFact[] {
  const board = weighted(pick, BOARDS)
  const era = weighted(pick, [
    ['1890/1919', 8],
    ['1920/1944', 14],
    ['1945/1964', 28],
    ['1965/1980', 26],
    ['1981/1999', 14],
    ['2000/2015', 7],
    [null, 3],
  ] as const)
  const exact = era !== null && pick.fraction() < 0.5 ? String(Number(era.slice(0, 4)) + pick.below(15)) : era
  const known: [FactKind, string | null][] = [
    ['board-type', board],
    ['rcd-cover', weighted(pick, COVERS)],
    ['ways', board !== null && pick.fraction() < 0.4 ? pick.one(WAYS[board]) : null],
    ['wiring', weighted(pick, WIRINGS)],
    ['built', exact],
    ['dwelling-type', weighted(pick, DWELLINGS)],
    ['bedrooms', String(1 + pick.below(4))],
    ['rewired', pick.fraction() < 0.25 ? String(1975 + pick.below(48)) : null],
  ]
  return known.flatMap(([kind, value]) =>
    value === null
      ? []
      : [
          {
            id: newId(),
            homeId: home.id,
            kind,
            value,
            source: 'import' as const,
            asOf: { day: today, precision: 'day' as const },
            note: null,
            recordedBy: null,
          },
        ],
  )
}

function workOf(pick: Pick, home: homes.Home, today: CalendarDay) {
  const facts: homeFacts.NewFact[] = []
  const reports: inspections.NewInspection[] = []
  const found: defects.NewDefect[] = []
  const from = { homeId: home.id, source: 'import' as const, note: null, recordedBy: null }
  const record = weighted(pick, RECORDS)
  if (record === 'never')
    facts.push({ ...from, id: newId(), kind: 'inspection-record', value: 'never', asOf: null })
  if (record !== 'dated') return { facts, reports, found }
  const times = 1 + pick.below(3)
  for (let time = 0; time < times; time += 1) {
    const day = addDays(today, -pick.below(365 * 7) - time * 365 * 5)
    const precision = weighted(pick, PRECISIONS)
    const { year, month } = partsOf(day)
    const first = { day, month: dayOf(year, month, 1), year: dayOf(year, 1, 1) }[precision]
    const inspection: inspections.NewInspection = {
      ...from,
      id: newId(),
      inspectedOn: { day: first, precision },
      assessment: pick.fraction() < 0.2 ? 'unsatisfactory' : 'satisfactory',
      nextDueOn: null,
    }
    reports.push(inspection)
    if (time > 0 || inspection.assessment === 'satisfactory') continue
    for (let defect = pick.below(4); defect > 0; defect -= 1) {
      const code = weighted<ClassificationCode>(pick, [
        ['C1', 2],
        ['C2', 45],
        ['C3', 45],
        ['FI', 8],
      ])
      found.push({
        ...from,
        id: newId(),
        inspectionId: inspection.id,
        code,
        description: 'As the report has it',
        location: null,
        raisedOn: inspection.inspectedOn,
      })
    }
  }
  return { facts, reports, found }
}

async function placesOf(scope: WritingScope, n: number) {
  const made = { patches: [] as string[], blocks: [] as string[] }
  for (let at = 0; at < 20; at += 1)
    made.patches.push((await patches.insert(scope, `Patch ${String(at + 1).padStart(2, '0')}`)).id)
  for (let at = 0; at < Math.max(1, Math.ceil(n / NUMBERS_A_STREET / 4)); at += 1)
    made.blocks.push((await blocks.insert(scope, `${FIRST[at % FIRST.length]} House ${at + 1}`)).id)
  return made
}

/**
 * Loads `n` homes with their facts, inspections and defects into an organisation without homes. Their derived rows
 * and scores are left to `rescoreOrganisation`, so that its own time can be measured.
 */
export async function loadHomes(
  owner: { readonly organisationId: string },
  n: number,
  { seed = 1, today = calendarDay('2026-12-01') }: { seed?: number; today?: CalendarDay } = {},
): Promise<void> {
  const pick = chance(seed)
  const places = await inTransaction(owner, (scope) => placesOf(scope, n))
  for (let from = 0; from < n; from += HOMES_A_PART) {
    const part = Array.from({ length: Math.min(HOMES_A_PART, n - from) }, (_, at) =>
      homeAt(pick, from + at, places),
    )
    const work = part.map((home) => workOf(pick, home, today))
    const facts = part.flatMap((home) => factsOf(pick, home, today))
    await inTransaction(owner, async (scope) => {
      await homes.insertMany(scope, part)
      await homeFacts.insertMany(scope, [...facts, ...work.flatMap((one) => one.facts)])
      await inspections.insertMany(
        scope,
        work.flatMap((one) => one.reports),
      )
      await defects.insertMany(
        scope,
        work.flatMap((one) => one.found),
      )
    })
  }
}
