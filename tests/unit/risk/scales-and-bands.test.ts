/** Edges and refusals of the scales and bands; values against print are in tests/reference/risk.test.ts. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { bandEdges, bandOf, usesHazardBands } from '@/lib/risk/bands'
import { harmScore, scoreInWords, weightOfSpread } from '@/lib/risk/harm-score'
import {
  LIKELIHOOD_SCALE,
  moveAlong,
  scalePointOf,
  STEP_FACTOR,
  stepsBetween,
} from '@/lib/risk/likelihood-scale'
import { OUTCOME_SCALE, outcomePointOf } from '@/lib/risk/outcome-scale'

describe('moving along the likelihood scale', () => {
  it('takes four steps to a factor of ten, either way', () => {
    expect(STEP_FACTOR ** 4).toBeCloseTo(10, 12)
    expect(moveAlong(1000, 4)).toBeCloseTo(100, 9)
    expect(moveAlong(100, -4)).toBeCloseTo(1000, 9)
    expect(moveAlong(1000, 0.5)).toBeCloseTo(1000 / 10 ** 0.125, 9)
    expect(stepsBetween(1000, 100)).toBeCloseTo(4, 12)
  })

  it('stays on the scale from where the scale is', () => {
    expect(moveAlong(10, 40)).toBe(1)
    expect(moveAlong(1000, -40)).toBe(5600)
    expect(moveAlong(5600, -1)).toBe(5600)
  })

  it('starts from an average rarer than the scale, not from its end', () => {
    expect(moveAlong(19_869, 4)).toBeCloseTo(1986.9, 9)
    expect(moveAlong(19_869, -4)).toBeCloseTo(198_690, 6)
    expect(moveAlong(19_869, 40)).toBe(1)
  })

  it('is likelier for more steps and for a likelier start', () => {
    const start = fc.double({ min: 1, max: 1e6, noNaN: true })
    const steps = fc.double({ min: -20, max: 20, noNaN: true })
    fc.assert(
      fc.property(start, start, steps, steps, (a, b, m, n) => {
        expect(moveAlong(a, Math.max(m, n))).toBeLessThanOrEqual(moveAlong(a, Math.min(m, n)))
        expect(moveAlong(Math.min(a, b), m)).toBeLessThanOrEqual(moveAlong(Math.max(a, b), m))
      }),
    )
  })

  it.each([
    [0, 1],
    [0.5, 1],
    [Number.NaN, 1],
    [Infinity, 1],
    [100, Number.NaN],
    [100, Infinity],
  ])('refuses 1 in %d moved by %d', (oneIn, steps) => {
    expect(() => moveAlong(oneIn, steps)).toThrow(RangeError)
  })
})

describe('points of the scales', () => {
  it('finds each point for itself, and gives an exact edge to the likelier one', () => {
    LIKELIHOOD_SCALE.forEach(({ oneIn, commoner }, i) => {
      expect(scalePointOf(oneIn)).toBe(oneIn)
      if (commoner !== null) expect(scalePointOf(commoner)).toBe(LIKELIHOOD_SCALE[i + 1]?.oneIn)
    })
    expect(scalePointOf(0.3)).toBe(1)
    expect(() => scalePointOf(0)).toThrow(RangeError)
    expect(() => scalePointOf(Number.NaN)).toThrow(RangeError)
  })

  it('finds each outcome point for itself and for its lower edge', () => {
    OUTCOME_SCALE.forEach(({ percent, from }) => {
      expect(outcomePointOf(percent)).toBe(percent)
      expect(outcomePointOf(from)).toBe(percent)
    })
    expect(outcomePointOf(100)).toBe(46.4)
    expect(() => outcomePointOf(-0.1)).toThrow(RangeError)
    expect(() => outcomePointOf(100.1)).toThrow(RangeError)
    expect(() => outcomePointOf(Number.NaN)).toThrow(RangeError)
  })
})

describe('harm score', () => {
  it('refuses what is no likelihood or no spread', () => {
    expect(() => harmScore(0.9, [100, 0, 0, 0])).toThrow(RangeError)
    expect(() => harmScore(Number.NaN, [100, 0, 0, 0])).toThrow(RangeError)
    expect(() => harmScore(10, [50, 0, 0, 0])).toThrow(RangeError)
    expect(() => harmScore(10, [101, -1, 0, 0])).toThrow(RangeError)
    expect(() => weightOfSpread([Number.NaN, 0, 0, 100])).toThrow(RangeError)
  })

  it('accepts a spread that its printing rounded', () => {
    expect(weightOfSpread([31.6, 4.6, 21.5, 42.2])).toBeCloseTo(327_472, 0)
  })

  it.each([
    [0.99, '<1'],
    [1, '1'],
    [37.4888, '37'],
    [999.6, '1,000'],
    [12_345.4, '12,345'],
  ])('shows %d as %s', (score, words) => {
    expect(scoreInWords(score)).toBe(words)
  })
})

describe('bands', () => {
  it('keeps a score of 999.6 in category 2 although it shows as 1,000', () => {
    expect(bandOf(999.6, 'wales')).toEqual({ name: 'D', edition: '2005', category: 2, comparison: false })
  })

  it('gives Scotland and Northern Ireland the words of England, as a comparison', () => {
    for (const nation of ['scotland', 'northern-ireland'] as const) {
      expect(bandOf(1200, nation, calendarDay('2020-01-01'))).toEqual({
        name: 'High',
        edition: 'england-2026',
        category: 1,
        comparison: true,
      })
      expect(usesHazardBands(nation)).toBe(false)
    }
    expect(usesHazardBands('wales')).toBe(true)
    expect(bandOf(1200, 'england').comparison).toBe(false)
  })

  it('has its axis from 0 upwards in the words of the day', () => {
    expect(bandEdges('england').map(({ name, from }) => [name, from])).toEqual([
      ['Low', 0],
      ['Medium', 100],
      ['High', 1000],
    ])
    expect(
      bandEdges('wales')
        .map(({ name }) => name)
        .join(''),
    ).toBe('JIHGFEDCBA')
    expect(bandEdges('england', calendarDay('2026-06-21'))).toBe(bandEdges('wales'))
  })

  it('refuses what is no score', () => {
    expect(() => bandOf(-1, 'wales')).toThrow(RangeError)
    expect(() => bandOf(Number.NaN, 'england')).toThrow(RangeError)
  })
})
