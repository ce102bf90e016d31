/** Made-up facts for the tests of the risk subject. */
import fc from 'fast-check'
import { type CalendarDay, calendarDay, dayOf } from '@/lib/calendar/calendar-day'
import { BOARD_TYPES } from '@/lib/homes/board-type'
import { DWELLING_TYPES } from '@/lib/homes/dwelling-type'
import { NATIONS } from '@/lib/homes/nation'
import { RCD_COVERS } from '@/lib/homes/rcd-cover'
import { WIRINGS } from '@/lib/homes/wiring'
import { UNKNOWN_YEAR } from '@/lib/homes/year-built'
import { type RiskFacts } from '@/lib/risk/assessment'

export const TODAY = calendarDay('2026-12-01')

export const NOTHING_KNOWN: RiskFacts = {
  nation: 'england',
  built: UNKNOWN_YEAR,
  dwellingType: 'unknown',
  boardType: 'unknown',
  rcdCover: 'unknown',
  wiring: 'unknown',
  rewired: null,
  inspectionRecord: 'unknown',
  inspectedOn: null,
  dueOn: null,
  open: { C1: 0, C2: 0, C3: 0, FI: 0 },
}

/** An average home of its era: every shift is none. */
export const REFERENCE_HOME: RiskFacts = {
  ...NOTHING_KNOWN,
  built: { from: 1930, to: 1930, about: false },
  dwellingType: 'semi-detached',
  boardType: 'breakers',
  rcdCover: 'sockets',
  wiring: 'pvc',
  rewired: 2001,
  inspectionRecord: 'dated',
  inspectedOn: { day: TODAY, precision: 'day' },
  dueOn: calendarDay('2031-12-01'),
}

const day: fc.Arbitrary<CalendarDay> = fc
  .tuple(
    fc.integer({ min: 1995, max: 2026 }),
    fc.integer({ min: 1, max: 12 }),
    fc.integer({ min: 1, max: 28 }),
  )
  .map(([year, month, date]) => dayOf(year, month, date))
const later: fc.Arbitrary<CalendarDay> = day.map((text) =>
  dayOf(Number(text.slice(0, 4)) + 5, Number(text.slice(5, 7)), Number(text.slice(8, 10))),
)

const built = fc.oneof(
  fc.constant(UNKNOWN_YEAR),
  fc.integer({ min: 1820, max: 2026 }).map((year) => ({ from: year, to: year, about: false })),
  fc
    .tuple(fc.integer({ min: 1820, max: 2010 }), fc.integer({ min: 0, max: 40 }))
    .map(([from, years]) => ({ from, to: Math.min(2026, from + years), about: true })),
  fc.integer({ min: 1850, max: 2020 }).map((to) => ({ from: null, to, about: false })),
  fc.integer({ min: 1850, max: 2026 }).map((from) => ({ from, to: null, about: false })),
)

const inspection = fc.oneof(
  fc.constant({ inspectionRecord: 'unknown', inspectedOn: null, dueOn: null } as const),
  fc.constant({ inspectionRecord: 'never', inspectedOn: null, dueOn: null } as const),
  fc.record({
    inspectionRecord: fc.constant('dated' as const),
    inspectedOn: fc.option(day.map((text) => ({ day: text, precision: 'day' as const }))),
    dueOn: fc.option(later),
  }),
)

const count = fc.oneof(fc.constant(0), fc.integer({ min: 0, max: 12 }))

/** Any home that a register could hold, known and unknown mixed. */
export const anyFacts: fc.Arbitrary<RiskFacts> = fc
  .record({
    nation: fc.constantFrom(...NATIONS),
    built,
    dwellingType: fc.constantFrom(...DWELLING_TYPES),
    boardType: fc.constantFrom(...BOARD_TYPES),
    rcdCover: fc.constantFrom(...RCD_COVERS),
    wiring: fc.constantFrom(...WIRINGS),
    rewired: fc.option(fc.integer({ min: 1900, max: 2026 })),
    inspection,
    open: fc.record({ C1: count, C2: count, C3: count, FI: count }),
  })
  .map(({ inspection: of, ...facts }) => ({ ...facts, ...of }))
