/** The provider's homes, as they stand on a day. */
import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay, partsOf } from '@/lib/calendar/calendar-day'
import { type DwellingType } from '@/lib/homes/dwelling-type'
import { type Tenure } from '@/lib/homes/tenure'
import { type YearBuilt } from '@/lib/homes/year-built'
import { type SeededRandom, seededRandom } from '../seeded-random'
import { type Town, TOWN_NAME } from '../town/town'
import { type DemoHome, type DemoInspection } from './demo-home'
import { draftOf } from './draft-of'
import { inspectionRecordOf } from './inspection-record'
import { type Installation, installationOf } from './installation'
import { reportOf } from './report'
import { scenes } from './scenes'
import { stock, type StockHome } from './stock'

export const FIRM = 'Fathom Electrical'

/** UPRNs from 990 000 000 001 upwards: twelve digits, and higher than any given out (from memory). */
const uprnOf = (row: number) => String(990_000_000_000 + row * 13 + 7)

const BEDROOMS: Partial<Record<StockHome['form'], Partial<Record<string, number>>>> = {
  flat: { 0: 8, 1: 48, 2: 40, 3: 4 },
  bungalow: { 1: 40, 2: 55, 3: 5 },
  'mid-terrace': { 2: 62, 3: 36, 4: 2 },
  'end-terrace': { 2: 45, 3: 50, 4: 5 },
  'semi-detached': { 2: 24, 3: 68, 4: 8 },
  detached: { 3: 66, 4: 34 },
}

function tenureOf({ kind, era, form }: StockHome, random: SeededRandom): Tenure {
  if (kind === 'communal') return 'unknown'
  if (era === 'quay')
    return random.weighted({
      'affordable-rent': 42,
      'shared-ownership': 24,
      leasehold: 20,
      'market-rent': 14,
    })
  if (form === 'flat')
    return random.weighted({ 'social-rent': 84, leasehold: 11, 'affordable-rent': 4, unknown: 1 })
  if (era === 'millennium')
    return random.weighted({ 'social-rent': 45, 'affordable-rent': 40, 'shared-ownership': 15 })
  return random.weighted({ 'social-rent': 93, 'affordable-rent': 5, unknown: 2 })
}

function builtAsListed({ built, builtAbout }: Installation, random: SeededRandom): YearBuilt {
  if (random.chance(0.03)) return { from: null, to: null, about: false }
  if (builtAbout) {
    const about = Math.round(built / 10) * 10
    return { from: about - 5, to: about + 5, about: true }
  }
  const decade = Math.floor(built / 10) * 10
  return random.chance(0.2)
    ? { from: decade, to: decade + 9, about: false }
    : { from: built, to: built, about: false }
}

/** A home of the stock on a day: its row in the list, and its reports where the register has them. */
function homeOf(home: StockHome, row: number, today: CalendarDay): DemoHome {
  const key = `${home.address}, ${home.postcode}`
  const random = seededRandom(`home ${key}`)
  const communal = home.kind === 'communal'
  const bedrooms = communal ? 2 : Number(random.weighted(BEDROOMS[home.form] ?? { 2: 1 }))
  const tower = home.block !== null && home.era === 'postwar' && (home.built ?? 0) >= 1964
  const found = installationOf(
    { key, era: home.era, street: home.block ?? home.street, built: home.built, tower, bedrooms },
    partsOf(today).year - 1,
  )
  const fromReport = random.chance(0.62)
  const record = inspectionRecordOf(
    { key, street: home.block ?? home.street, built: found.built, fromReport },
    today,
  )
  // the stock list's board column has holes, most of them in the older streets
  const blind = random.chance(found.unitFitted < 1980 ? 0.26 : 0.2)
  const reported = record.kind === 'dated' && fromReport
  const draft = draftOf({
    row,
    kind: home.kind,
    reference: communal ? `LS-${String(row).padStart(5, '0')}` : `LAR-${String(row).padStart(5, '0')}`,
    uprn: random.chance(0.035) ? null : uprnOf(row),
    address: home.address,
    town: TOWN_NAME,
    postcode: home.postcode,
    block: home.block,
    patch: random.chance(0.006) ? null : home.patch,
    tenure: tenureOf(home, random),
    built: builtAsListed(found, random),
    dwellingType: communal || random.chance(0.02) ? 'unknown' : (home.form as DwellingType),
    bedrooms: communal ? null : bedrooms,
    rewired: found.rewired !== null && random.chance(0.8) ? found.rewired : null,
    ...(!blind &&
      !reported &&
      record.kind !== 'never' && {
        boardType: found.boardType,
        rcdCover: random.chance(0.14) ? 'unknown' : found.rcdCover,
        wiring: random.chance(0.4) ? 'unknown' : found.wiring,
      }),
    inspectionRecord: record.kind === 'dated' ? 'unknown' : record.kind,
    ...(record.kind === 'dated' &&
      !fromReport && {
        inspectionRecord: 'dated',
        lastInspection: record.on,
        assessment: random.chance(0.5) ? random.weighted({ satisfactory: 82, unsatisfactory: 18 }) : null,
      }),
    ...(random.chance(0.026) ? {} : home.place),
    note: random.chance(0.03) ? random.pick(NOTES) : null,
  })
  const inspections: DemoInspection[] = []
  if (record.kind === 'dated' && fromReport) {
    if (record.before) {
      const then = installationOf(
        {
          key: `${key} before`,
          era: home.era,
          street: home.block ?? home.street,
          built: home.built,
          tower,
          bedrooms,
        },
        partsOf(record.before).year - 1,
      )
      const older = found.unitFitted > partsOf(record.before).year ? then : found
      inspections.push(
        reportOf(older, record.before, today, { firm: 'Tidewater Testing', random, superseded: true }),
      )
    }
    inspections.push(reportOf(found, record.on.day, today, { firm: FIRM, random }))
  }
  return { draft, inspections, corrections: [], officerDefects: [] }
}

const NOTES = [
  'Key safe by the back door.',
  'Ring before calling: tenant works nights.',
  'Loft hatch painted shut.',
  'Dog in the yard.',
  'Access through number next door; shared passage.',
]

/** Every home of the provider on a day, with the scenes that a demo needs. */
export function providerHomes(town: Town, today: CalendarDay): DemoHome[] {
  const homes = stock(town).map((home, at) => homeOf(home, at + 1, today))
  return scenes(homes, (days) => addDays(today, -days))
}
