/**
 * Unknown facts: the exact mean and range, checked against a plain loop over everything that they could be, and the
 * rule that not knowing is never good news. The method's own promises; no source.
 */
import fc from 'fast-check'
import { describe, expect, it, vi } from 'vitest'
import { assess } from '@/lib/risk/assess'
import { type RiskFacts } from '@/lib/risk/assessment'
import { KNOWN_BOARD_TYPES, KNOWN_RCD_COVERS, KNOWN_WIRINGS } from '@/lib/risk/beliefs'
import { FIRST_METHOD } from '@/lib/risk/first-method'
import { weightOfSpread } from '@/lib/risk/harm-score'
import { type ShiftKey } from '@/lib/risk/method'
import { anyFacts, NOTHING_KNOWN, REFERENCE_HOME, TODAY } from './risk-facts'

// many made-up homes a test, on a machine that may be busy
vi.setConfig({ testTimeout: 30_000 })

const scored = (facts: RiskFacts) => assess(facts, FIRST_METHOD, TODAY)
const { beliefs } = FIRST_METHOD

describe('not knowing', () => {
  const NONE_OPEN = { C1: 0, C2: 0, C3: 0, FI: 0 }
  const BEST: [string, Partial<RiskFacts>, Partial<RiskFacts>][] = [
    ['the board', { boardType: 'unknown' }, { boardType: 'rcbo' }],
    ['RCD cover', { rcdCover: 'unknown' }, { rcdCover: 'all' }],
    ['the wiring', { wiring: 'unknown' }, { wiring: 'pvc' }],
    ['the year of rewiring', { rewired: null }, { rewired: 2026 }],
    ['the dwelling', { dwellingType: 'unknown' }, { dwellingType: 'detached' }],
    [
      'the last inspection',
      { inspectionRecord: 'unknown' },
      { inspectionRecord: 'dated', inspectedOn: { day: TODAY, precision: 'day' }, dueOn: null },
    ],
    ['the year', { built: NOTHING_KNOWN.built }, { built: { from: 2026, to: 2026, about: false } }],
  ]

  it.each(BEST)('%s never scores below the best that it could be', (_, unknown, best) => {
    fc.assert(
      fc.property(anyFacts, (some) => {
        const facts = { ...some, open: NONE_OPEN }
        const without = scored({ ...facts, ...unknown })
        const known = scored({ ...facts, ...best })
        without.hazards.forEach((hazard, i) =>
          expect(hazard.score).toBeGreaterThanOrEqual((known.hazards[i]?.score ?? Number.NaN) * (1 - 1e-9)),
        )
        expect(without.score).toBeGreaterThanOrEqual(known.score * (1 - 1e-9))
      }),
      { numRuns: 150 },
    )
  })

  it('the board scores the mean over the boards of its time', () => {
    const unknown = scored({ ...REFERENCE_HOME, rewired: 1970, boardType: 'unknown', rcdCover: 'unknown' })
    const shares = beliefs.boardType['1966-79']
    unknown.hazards.forEach((hazard, i) => {
      const mean = KNOWN_BOARD_TYPES.reduce((sum, boardType) => {
        const known = scored({ ...REFERENCE_HOME, rewired: 1970, boardType, rcdCover: 'unknown' })
        return sum + shares[boardType] * (known.hazards[i]?.score ?? Number.NaN)
      }, 0)
      expect(hazard.score / mean).toBeCloseTo(1, 9)
    })
  })

  it('leans to the cautious side: all unknown scores above the home with average features', () => {
    for (const year of [1900, 1930, 1955, 1970, 1985]) {
      const built = { from: year, to: year, about: false }
      const unknown = scored({ ...NOTHING_KNOWN, dwellingType: 'detached', built })
      const average = scored({ ...REFERENCE_HOME, built })
      expect(unknown.score).toBeGreaterThan(2 * average.score)
    }
  })

  it('takes other beliefs where they are given', () => {
    const never = { ...beliefs, inspection: [{ state: 'never', extent: 0, share: 1 } as const] }
    const facts: RiskFacts = { ...REFERENCE_HOME, inspectionRecord: 'unknown' }
    const told = scored({ ...facts, inspectionRecord: 'never' })
    expect(assess(facts, FIRST_METHOD, TODAY, never).score).toBeCloseTo(told.score, 9)
    expect(scored(facts).score).toBeLessThan(told.score)
  })
})

describe('the mean and range', () => {
  // a flat of 1930 rewired in 1970, never inspected: wiring, board and cover unknown, looped over one by one
  it('are those of a plain loop over everything', () => {
    const steps = new Map(FIRST_METHOD.shifts.map((row) => [row.key, row.steps]))
    const facts: RiskFacts = {
      ...NOTHING_KNOWN,
      built: { from: 1930, to: 1930, about: false },
      dwellingType: 'flat',
      rewired: 1970,
      inspectionRecord: 'never',
    }
    for (const { hazard, score, low, high, base } of scored(facts).hazards) {
      const at = (key: ShiftKey) => steps.get(key)?.[hazard] ?? Number.NaN
      const age = at('wiring-age/40') + ((at('wiring-age/60') - at('wiring-age/40')) * 16) / 20
      const cases: { score: number; weight: number }[] = []
      for (const wiring of KNOWN_WIRINGS) {
        for (const board of KNOWN_BOARD_TYPES) {
          for (const cover of KNOWN_RCD_COVERS) {
            const sum =
              age +
              at('inspection/never') +
              at(`wiring/${wiring}`) +
              at(`board-type/${board}`) +
              at(`rcd-cover/${cover}`)
            const likelihood = Math.min(1, 10 ** (sum / 4) / base.oneIn)
            cases.push({
              score: weightOfSpread(FIRST_METHOD.spreads[hazard].spread) * likelihood,
              weight:
                beliefs.wiring['1966-79'][wiring] *
                beliefs.boardType['1966-79'][board] *
                beliefs.rcdCover[board][cover],
            })
          }
        }
      }
      const mean = cases.reduce((total, of) => total + of.score * of.weight, 0)
      const pointAt = (part: number) => {
        let gone = 0
        const sorted = cases.sort((a, b) => a.score - b.score)
        return sorted.find(({ weight }) => (gone += weight) >= part - 1e-12)?.score ?? Number.NaN
      }
      expect(score / mean).toBeCloseTo(1, 9)
      expect(low / Math.min(mean, pointAt(0.05))).toBeCloseTo(1, 9)
      expect(high / Math.max(mean, pointAt(0.95))).toBeCloseTo(1, 9)
    }
  })

  it('let a known fact inform what hangs with it: rubber makes the wiring old', () => {
    const facts: RiskFacts = { ...REFERENCE_HOME, rewired: null }
    const ageOf = (wiring: RiskFacts['wiring']) =>
      scored({ ...facts, wiring }).hazards[0]?.shifts.find(({ fact }) => fact === 'rewired')?.steps ??
      Number.NaN
    expect(ageOf('rubber')).toBeGreaterThan(ageOf('pvc') + 0.5)
  })

  it('stay sound where known facts contradict the beliefs', () => {
    const odd = {
      ...beliefs,
      rcdCover: { ...beliefs.rcdCover, rcbo: { none: 0, sockets: 0, part: 0, all: 1 } },
    }
    const facts: RiskFacts = { ...NOTHING_KNOWN, boardType: 'rcbo', rcdCover: 'none' }
    const { score, low, high } = assess(facts, FIRST_METHOD, TODAY, odd)
    expect(score).toBeGreaterThan(0)
    expect(low).toBeLessThanOrEqual(score)
    expect(high).toBeLessThan(Number.POSITIVE_INFINITY)
  })
})

it('keeps to the base of a home whose year or kind is uncertain', () => {
  const certain = scored({
    ...NOTHING_KNOWN,
    built: { from: 1930, to: 1935, about: true },
    dwellingType: 'detached',
  })
  expect(certain.hazards[0]?.base).toEqual({
    oneIn: 19_869,
    words: 'Electrical hazards to a child under 5, house built 1920 to 1945',
    basis: 'published',
    source: 'Government worked-example sheet, 1997-99 average',
  })
  expect(certain.unknowns).not.toContain('built')
  const uncertain = scored(NOTHING_KNOWN)
  expect(uncertain.hazards[1]?.base.words).toBe(
    'Electrical part of fire to someone of 60 or over, home of uncertain age',
  )
  expect(uncertain.hazards[1]?.base.basis).toBe('judgement')
  expect(uncertain.unknowns).toEqual([
    'board-type',
    'rcd-cover',
    'wiring',
    'rewired',
    'built',
    'dwelling-type',
    'inspection',
  ])
})
