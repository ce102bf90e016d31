/** A home as its screens are given it: scored by the program's own method, with as much known as the test says. */
import { type DefectShown, type FactShown, type HomeShown } from '@/components/homes/home-shown'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { intervalRule, ruleCitation } from '@/lib/duties/interval-rules'
import { FACT_KINDS, type FactKind } from '@/lib/homes/fact'
import { type HomeRow } from '@/lib/homes/home-row'
import { assess } from '@/lib/risk/assess'
import { FIRST_METHOD } from '@/lib/risk/first-method'

export const TODAY = calendarDay('2026-12-01')
export const onDay = (day: string): PartialDate => ({ day: calendarDay(day), precision: 'day' })
const RECORDED = { recordedBy: 'Ada Marsh', recordedAt: new Date('2026-06-30T23:30:00Z') }

export const aFact = (kind: FactKind, value: string | null, more: Partial<FactShown> = {}): FactShown => ({
  ...RECORDED,
  id: `id-of-${kind}`,
  kind,
  value,
  source: 'inspection',
  asOf: onDay('2016-03-14'),
  note: null,
  ...more,
})

export const aDefect = (more: Partial<DefectShown> = {}): DefectShown => ({
  ...RECORDED,
  id: 'defect-1',
  code: 'C2',
  description: 'No main bonding to the gas service',
  location: null,
  source: 'inspection',
  raisedOn: onDay('2016-03-14'),
  closedOn: null,
  closedNote: null,
  closedBy: null,
  ...more,
})

/** Nothing is known of it but where it is. */
export const A_BARE_HOME: HomeRow = {
  id: '018f0000-0000-7000-8000-000000000001',
  kind: 'dwelling',
  reference: null,
  uprn: null,
  address: '14 Lantern Row',
  town: null,
  postcode: null,
  patch: null,
  block: null,
  nation: 'england',
  tenure: 'unknown',
  built: { from: null, to: null, about: false },
  dwellingType: 'unknown',
  bedrooms: null,
  boardType: 'unknown',
  rcdCover: 'unknown',
  ways: null,
  wiring: 'unknown',
  rewired: null,
  inspectionRecord: 'unknown',
  inspectedOn: null,
  assessment: null,
  dueOn: null,
  standing: 'unknown date',
  open: { C1: 0, C2: 0, C3: 0, FI: 0 },
  score: 0,
  scoreLow: 0,
  scoreHigh: 0,
  place: null,
}

/** A home of 1931 with rewireable fuses, no RCD and a report that has lapsed. */
export const A_KNOWN_HOME: HomeRow = {
  ...A_BARE_HOME,
  uprn: '100099004121',
  postcode: 'ZX1 4AB',
  patch: { id: 'patch-1', name: 'Ferry Bank' },
  tenure: 'social-rent',
  built: { from: 1931, to: 1931, about: false },
  dwellingType: 'mid-terrace',
  boardType: 'rewireable',
  rcdCover: 'none',
  ways: 'RRRRRU',
  inspectionRecord: 'dated',
  inspectedOn: onDay('2016-03-14'),
  dueOn: calendarDay('2021-03-14'),
  standing: 'lapsed',
  place: { latitude: 54, longitude: 2 },
}

export function aHomeShown(home: HomeRow, more: Partial<HomeShown> = {}): HomeShown {
  const rule = intervalRule(home.nation, 'private')
  return {
    home,
    note: null,
    standing: { reason: 'So it stands.', rule, citation: ruleCitation(rule), decidedBy: null, isOwed: true },
    facts: FACT_KINDS.map((kind) => ({ kind, current: null, before: [] })),
    inspections: [],
    openDefects: [],
    closedDefects: [],
    assessment: assess(home, FIRST_METHOD, TODAY),
    rank: { place: 3, of: 2412 },
    scoreHistory: [],
    neighbours: null,
    mayEdit: true,
    ...more,
  }
}
