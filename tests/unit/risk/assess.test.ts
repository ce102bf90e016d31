/** The rules that a score must keep, whatever the facts. Common practice and the method's own promises; no source. */
import fc from 'fast-check'
import { describe, expect, it, vi } from 'vitest'
import { assess } from '@/lib/risk/assess'
import { type Assessment, type RiskFacts } from '@/lib/risk/assessment'
import { FIRST_METHOD } from '@/lib/risk/first-method'
import { weightOfSpread } from '@/lib/risk/harm-score'
import { moveAlong } from '@/lib/risk/likelihood-scale'
import { dayOf } from '@/lib/calendar/calendar-day'
import { anyFacts, NOTHING_KNOWN, REFERENCE_HOME, TODAY } from './risk-facts'

// many made-up homes a test, on a machine that may be busy
vi.setConfig({ testTimeout: 30_000 })

const RUNS = { numRuns: 300 }
const scored = (facts: RiskFacts): Assessment => assess(facts, FIRST_METHOD, TODAY)

/** What every fact of a home can be set to, one at a time. */
const oneOtherFact: fc.Arbitrary<(facts: RiskFacts) => Partial<RiskFacts>> = fc
  .tuple(
    anyFacts,
    fc.constantFrom(
      'built',
      'dwellingType',
      'boardType',
      'rcdCover',
      'wiring',
      'rewired',
      'inspection',
      'defects',
    ),
  )
  .map(([other, fact]) => (facts: RiskFacts): Partial<RiskFacts> => {
    const { inspectionRecord, inspectedOn, dueOn } = other
    if (fact === 'inspection') return { inspectionRecord, inspectedOn, dueOn }
    if (fact !== 'defects') return { [fact]: other[fact as 'built'] }
    const code = (['C2', 'C3', 'FI'] as const)[other.open.C2 % 3] ?? 'C2'
    return { open: { ...facts.open, [code]: 40 } }
  })

describe('an open C1', () => {
  it('outweighs any other single fact', () => {
    fc.assert(
      fc.property(anyFacts, oneOtherFact, (some, change) => {
        const facts = { ...some, open: { ...some.open, C1: 0 } }
        const danger = scored({ ...facts, open: { ...facts.open, C1: 1 } })
        const changed = scored({ ...facts, ...change(facts) })
        danger.hazards.forEach((hazard, i) => {
          // where danger and change both reach 1 in 1 there is nothing left to outweigh
          if (hazard.oneIn > 1.0001)
            expect(hazard.score).toBeGreaterThan(changed.hazards[i]?.score ?? Infinity)
        })
      }),
      { numRuns: 1000 },
    )
  })
})

describe('age of the house alone', () => {
  it('moves a home whose wiring is dated by half a step at most, the oldest against the newest', () => {
    const at = (year: number) => scored({ ...REFERENCE_HOME, built: { from: year, to: year, about: false } })
    const [oldest, newest] = [at(1850), at(2001)]
    oldest.hazards.forEach((hazard, i) => {
      const steps = 4 * Math.log10(hazard.score / (newest.hazards[i]?.score ?? Number.NaN))
      expect(steps).toBeGreaterThanOrEqual(0)
      expect(steps).toBeLessThanOrEqual(0.5 + 1e-9)
    })
  })

  it('moves less than a rewireable board, even where it must stand for the unknown age of the wiring', () => {
    const at = (year: number) =>
      scored({ ...REFERENCE_HOME, rewired: null, built: { from: year, to: year, about: false } }).score
    expect(at(1850) / at(2020)).toBeLessThan(
      scored({ ...REFERENCE_HOME, boardType: 'rewireable' }).score / scored(REFERENCE_HOME).score,
    )
  })
})

describe('every score', () => {
  it('is finite, above 0, within its range, and is the higher of its hazards', () => {
    fc.assert(
      fc.property(anyFacts, (facts) => {
        const { score, low, high, hazards } = scored(facts)
        for (const of of [{ score, low, high }, ...hazards]) {
          expect(of.score).toBeGreaterThan(0)
          expect(Number.isFinite(of.score)).toBe(true)
          expect(of.low).toBeGreaterThan(0)
          expect(of.low).toBeLessThanOrEqual(of.score)
          expect(of.score).toBeLessThanOrEqual(of.high)
        }
        expect(score).toBe(Math.max(...hazards.map((hazard) => hazard.score)))
        hazards.forEach(({ score: part, oneIn, spread }) => {
          expect(oneIn).toBeGreaterThanOrEqual(1 - 1e-12)
          expect(part).toBeCloseTo(weightOfSpread(spread) / oneIn, 6)
        })
      }),
      RUNS,
    )
  })

  it('is the same for the same facts, day and method, whatever was scored before', () => {
    fc.assert(
      fc.property(anyFacts, anyFacts, (facts, other) => {
        const fresh = assess(facts, structuredClone(FIRST_METHOD), TODAY)
        scored(other)
        expect(scored(facts)).toEqual(fresh)
      }),
      { numRuns: 50 },
    )
  })

  it('adds up: the base moved by its shifts is the likelihood, where nothing reached 1 in 1', () => {
    fc.assert(
      fc.property(anyFacts, (some) => {
        const { hazards } = scored({ ...some, open: { ...some.open, C1: 0, C2: 0, FI: 0 } })
        for (const { base, shifts, oneIn } of hazards) {
          const steps = shifts.reduce((sum, shift) => sum + shift.steps, 0)
          expect(moveAlong(base.oneIn, steps) / oneIn).toBeCloseTo(1, 9)
        }
      }),
      RUNS,
    )
  })

  it('has no range where everything is known, and names every unknown once', () => {
    const known = scored(REFERENCE_HOME)
    expect(known.unknowns).toEqual([])
    known.hazards.forEach(({ score, low, high }) => {
      expect(low).toBe(score)
      expect(high).toBe(score)
    })
    fc.assert(
      fc.property(anyFacts, (facts) => {
        const { unknowns, hazards } = scored(facts)
        hazards.forEach(({ shifts }) =>
          expect(shifts.filter(({ unknown }) => unknown).map(({ fact }) => fact)).toEqual(unknowns),
        )
      }),
      RUNS,
    )
  })
})

it('explains each known fact and each open defect of a home', () => {
  const facts: RiskFacts = {
    ...REFERENCE_HOME,
    boardType: 'rewireable',
    dwellingType: 'bedsit',
    inspectionRecord: 'never',
    open: { C1: 1, C2: 3, C3: 0, FI: 0 },
  }
  const reasons = scored(facts).hazards[1]?.shifts.map(({ reason }) => reason)
  expect(reasons).toEqual([
    'Rewireable fuses',
    'RCD on the sockets',
    'PVC wiring',
    'Bedsit',
    'Wiring 25 years old',
    'Never inspected',
    '1 open C1',
    '3 open C2',
  ])
})

it('tells how long an inspection has lapsed', () => {
  const reasonOf = (dueOn: string) =>
    scored({
      ...REFERENCE_HOME,
      dueOn: dayOf(Number(dueOn.slice(0, 4)), 6, 1),
      inspectedOn: null,
    }).hazards[0]?.shifts.find(({ fact }) => fact === 'inspection')?.reason
  expect(reasonOf('2030')).toBe('Inspection in date')
  expect(reasonOf('2026')).toBe('Inspection lapsed under a year ago')
  expect(reasonOf('2023')).toBe('Inspection lapsed over 3 years ago')
})

it('cuts nothing but what would be likelier than 1 in 1', () => {
  const dreadful = scored({
    ...NOTHING_KNOWN,
    boardType: 'rewireable',
    rcdCover: 'none',
    wiring: 'lead',
    rewired: 1930,
    inspectionRecord: 'never',
    open: { C1: 9, C2: 9, C3: 9, FI: 9 },
  })
  dreadful.hazards.forEach(({ oneIn, score, high, spread }) => {
    expect(oneIn).toBeCloseTo(1, 9)
    expect(score).toBeCloseTo(weightOfSpread(spread), 6)
    expect(high).toBeCloseTo(score, 6)
  })
})
