/** Worse facts never lower a score, with anything known or unknown beside them. The method's own promise; no source. */
import fc from 'fast-check'
import { describe, expect, it, vi } from 'vitest'
import { dayOf } from '@/lib/calendar/calendar-day'
import { type BoardType } from '@/lib/homes/board-type'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type Wiring } from '@/lib/homes/wiring'
import { assess } from '@/lib/risk/assess'
import { type Assessment, type RiskFacts } from '@/lib/risk/assessment'
import { FIRST_METHOD } from '@/lib/risk/first-method'
import { anyFacts, TODAY } from './risk-facts'

// many made-up homes a test, on a machine that may be busy
vi.setConfig({ testTimeout: 30_000 })

const RUNS = { numRuns: 300 }
const scored = (facts: RiskFacts): Assessment => assess(facts, FIRST_METHOD, TODAY)

/** Never lower, for the home and for each hazard; a hair for the last bit of a sum. */
function expectNeverLower(worse: RiskFacts, better: RiskFacts) {
  const high = scored(worse)
  const low = scored(better)
  expect(high.score).toBeGreaterThanOrEqual(low.score * (1 - 1e-9))
  high.hazards.forEach((hazard, i) => {
    expect(hazard.score).toBeGreaterThanOrEqual((low.hazards[i]?.score ?? Number.NaN) * (1 - 1e-9))
  })
}

const BOARDS_WORST_FIRST: BoardType[] = ['rewireable', 'mixed', 'cartridge', 'breakers', 'rcbo']
const COVERS_WORST_FIRST: RcdCover[] = ['none', 'sockets', 'all']
const WIRINGS_WORST_FIRST: Wiring[] = ['rubber', 'mixed', 'pvc']
const inOrder = <T>(list: readonly T[]) => fc.subarray([...list], { minLength: 2, maxLength: 2 })

describe('worse facts never lower a score', () => {
  it('by the board', () => {
    fc.assert(
      fc.property(anyFacts, inOrder(BOARDS_WORST_FIRST), (facts, [worse, better]) =>
        expectNeverLower(
          { ...facts, boardType: worse as BoardType },
          { ...facts, boardType: better as BoardType },
        ),
      ),
      RUNS,
    )
  })

  it('by RCD cover, part being no worse than none and no better than all', () => {
    const orders = fc.oneof(inOrder(COVERS_WORST_FIRST), inOrder<RcdCover>(['none', 'part', 'all']))
    fc.assert(
      fc.property(anyFacts, orders, (facts, [worse, better]) =>
        expectNeverLower(
          { ...facts, rcdCover: worse as RcdCover },
          { ...facts, rcdCover: better as RcdCover },
        ),
      ),
      RUNS,
    )
  })

  it('by the wiring', () => {
    const orders = fc.oneof(inOrder(WIRINGS_WORST_FIRST), inOrder<Wiring>(['lead', 'mixed', 'pvc']))
    fc.assert(
      fc.property(anyFacts, orders, (facts, [worse, better]) =>
        expectNeverLower({ ...facts, wiring: worse as Wiring }, { ...facts, wiring: better as Wiring }),
      ),
      RUNS,
    )
  })

  it('by the year of rewiring', () => {
    const years = fc.tuple(fc.integer({ min: 1900, max: 2026 }), fc.integer({ min: 0, max: 60 }))
    fc.assert(
      fc.property(anyFacts, years, (facts, [rewired, earlier]) =>
        expectNeverLower({ ...facts, rewired: rewired - earlier }, { ...facts, rewired }),
      ),
      RUNS,
    )
  })

  it('by the year of building', () => {
    const years = fc.tuple(fc.integer({ min: 1850, max: 2026 }), fc.integer({ min: 0, max: 100 }))
    const at = (year: number) => ({ from: year, to: year, about: false })
    fc.assert(
      fc.property(anyFacts, years, (facts, [year, earlier]) =>
        expectNeverLower({ ...facts, built: at(year - earlier) }, { ...facts, built: at(year) }),
      ),
      RUNS,
    )
  })

  it('by open defects of any code', () => {
    const more = fc.tuple(fc.constantFrom('C1', 'C2', 'C3', 'FI'), fc.integer({ min: 1, max: 9 }))
    fc.assert(
      fc.property(anyFacts, more, (facts, [code, extra]) => {
        const key = code as keyof RiskFacts['open']
        expectNeverLower({ ...facts, open: { ...facts.open, [key]: facts.open[key] + extra } }, facts)
      }),
      RUNS,
    )
  })

  it('by an earlier inspection, an earlier end of its term, and having had none', () => {
    const dates = fc.tuple(
      fc.integer({ min: 2000, max: 2026 }),
      fc.integer({ min: 0, max: 20 }),
      fc.boolean(),
    )
    const at = (year: number) => dayOf(year, 6, 1)
    fc.assert(
      fc.property(anyFacts, dates, (facts, [year, earlier, byEnd]) => {
        const dated = { ...facts, inspectionRecord: 'dated' as const }
        const inspected = (day: number) => ({ day: at(day), precision: 'day' as const })
        const better = byEnd
          ? { ...dated, dueOn: at(year + 5) }
          : { ...dated, inspectedOn: inspected(year), dueOn: null }
        const worse = byEnd
          ? { ...dated, dueOn: at(year + 5 - earlier) }
          : { ...dated, inspectedOn: inspected(year - earlier), dueOn: null }
        expectNeverLower(worse, better)
        expectNeverLower({ ...facts, inspectionRecord: 'never' }, worse)
      }),
      RUNS,
    )
  })
})
