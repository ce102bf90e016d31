/** What a method must keep to before it may score a home, and the small rules that its rows feed. No source. */
import { describe, expect, it } from 'vitest'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { assess } from '@/lib/risk/assess'
import { defectSteps } from '@/lib/risk/defect-steps'
import { ERAS, eraOf, eraWeights, wiringPeriodOf } from '@/lib/risk/eras'
import { FIRST_METHOD } from '@/lib/risk/first-method'
import { inspectionStateOf, inspectionSteps } from '@/lib/risk/inspection-steps'
import { type Method, type ShiftKey } from '@/lib/risk/method'
import { methodProblems } from '@/lib/risk/method-problems'
import { AGE_BANDS, NATIONAL_AVERAGES } from '@/lib/risk/national-averages'
import { wiringAgeSteps } from '@/lib/risk/wiring-age-steps'
import { NOTHING_KNOWN, TODAY } from './risk-facts'

const withSteps = (key: ShiftKey, electrical: number): Method => ({
  ...FIRST_METHOD,
  shifts: FIRST_METHOD.shifts.map((row) =>
    row.key === key ? { ...row, steps: { ...row.steps, electrical } } : row,
  ),
})

describe('the first method', () => {
  it('is sound, and plain data that survives being kept as JSON', () => {
    expect(methodProblems(FIRST_METHOD)).toEqual([])
    expect(JSON.parse(JSON.stringify(FIRST_METHOD))).toEqual(FIRST_METHOD)
  })

  it('gives every row a reason and a source, and calls no step published', () => {
    for (const row of FIRST_METHOD.shifts) {
      expect(row.reason.length).toBeGreaterThan(2)
      expect(row.source.length).toBeGreaterThan(10)
      expect(row.basis).toBe('judgement')
    }
  })

  it('lets age move an average little: within a step, and never likelier for a newer home', () => {
    for (const hazard of ['electrical', 'fire']) {
      for (const kind of ['house', 'flat']) {
        const cells = AGE_BANDS.map(
          (band) =>
            NATIONAL_AVERAGES.find((of) => of.hazard === hazard && of.kind === kind && of.ageBand === band)
              ?.oneIn ?? 0,
        )
        expect([...cells].sort((a, b) => a - b)).toEqual(cells)
        expect((cells.at(-1) ?? Infinity) / (cells[0] ?? 0)).toBeLessThan(10 ** 0.25)
      }
    }
  })
})

describe('an unsound method', () => {
  const { beliefs } = FIRST_METHOD
  it.each<[string, Method, string]>([
    ['a better board that adds more', withSteps('board-type/rcbo', 1), 'board-type/breakers'],
    ['a fact that outweighs a C1', withSteps('rcd-cover/none', 6), 'weighs as much as an open C1'],
    ['a row below 0', withSteps('inspection/term-end', -1), 'is below 0'],
    ['a row off the scale', withSteps('defects/C1-most', 17), 'not within 16 steps'],
    ['a row that is no number', withSteps('wiring/pvc', Number.NaN), 'not within 16 steps'],
    ['a row missing', { ...FIRST_METHOD, shifts: FIRST_METHOD.shifts.slice(1) }, 'is missing'],
    [
      'a row twice',
      { ...FIRST_METHOD, shifts: FIRST_METHOD.shifts.concat(FIRST_METHOD.shifts[0] ?? []) },
      'twice',
    ],
    [
      'an average missing',
      { ...FIRST_METHOD, averages: NATIONAL_AVERAGES.slice(1) },
      'No one average for electrical',
    ],
    [
      'a spread that does not add up',
      {
        ...FIRST_METHOD,
        spreads: { ...FIRST_METHOD.spreads, fire: { spread: [1, 1, 1, 1], basis: 'judgement', source: '' } },
      },
      'spread of harm of fire',
    ],
    [
      'a share of more than all',
      {
        ...FIRST_METHOD,
        share: { ...FIRST_METHOD.share, fire: { part: 1.1, basis: 'judgement', source: '' } },
      },
      'share of fire',
    ],
    ['no usual term', { ...FIRST_METHOD, usualTermYears: 0 }, 'usual term'],
    [
      'shares that do not add up',
      { ...FIRST_METHOD, beliefs: { ...beliefs, era: { ...beliefs.era, '2008-on': 0.5 } } },
      'Shares of era',
    ],
    [
      'no belief of inspections',
      { ...FIRST_METHOD, beliefs: { ...beliefs, inspection: [] } },
      'Shares of inspection',
    ],
  ])('is told of %s, and scores nothing', (_, method, problem) => {
    expect(methodProblems(method).join('; ')).toContain(problem)
    expect(() => assess(NOTHING_KNOWN, method, TODAY)).toThrow(RangeError)
  })
})

describe('open defects', () => {
  it('count the first fully and near a most', () => {
    expect(defectSteps(0, 3, 4.5)).toBe(0)
    expect(defectSteps(-2, 3, 4.5)).toBe(0)
    expect(defectSteps(1, 3, 4.5)).toBeCloseTo(3, 12)
    expect(defectSteps(2, 3, 4.5)).toBeCloseTo(4, 12)
    expect(defectSteps(99, 3, 4.5)).toBeCloseTo(4.5, 9)
    expect(defectSteps(3, 2, 2)).toBe(2)
    expect(defectSteps(3, 0, 0)).toBe(0)
  })
})

describe('age of wiring', () => {
  const points = [
    { years: 0, steps: -1 },
    { years: 40, steps: 1 },
    { years: 60, steps: 2 },
  ]
  it.each([
    [-5, -1],
    [0, -1],
    [20, 0],
    [40, 1],
    [50, 1.5],
    [90, 2],
  ])('%d years give %d steps', (years, steps) => {
    expect(wiringAgeSteps(years, points)).toBeCloseTo(steps, 12)
  })

  it('without points is none', () => {
    expect(wiringAgeSteps(30, [])).toBe(0)
  })
})

describe('the last inspection', () => {
  const rows = { termEnd: 0.5, lapsedYear: 0.2, lapsedMost: 2, never: 3 }
  const day = calendarDay
  const dated = (inspectedOn: string | null, dueOn: string | null) =>
    inspectionStateOf(
      {
        inspectionRecord: 'dated',
        inspectedOn: inspectedOn === null ? null : { day: day(inspectedOn), precision: 'month' },
        dueOn: dueOn === null ? null : day(dueOn),
      },
      TODAY,
      5,
    )

  it('is in date by the part of its term gone', () => {
    expect(dated('2024-12-01', '2028-12-01')).toMatchObject({ state: 'in date' })
    expect(dated('2024-12-01', '2028-12-01')?.extent).toBeCloseTo(0.5, 2)
    expect(dated('2026-12-01', '2026-12-01')).toEqual({ state: 'in date', extent: 0 })
    expect(dated('2027-12-01', '2030-12-01')?.extent).toBe(0)
  })

  it('takes the usual term where a date is missing', () => {
    expect(dated('2025-06-01', null)).toMatchObject({ state: 'in date' })
    expect(dated('2025-06-01', null)?.extent).toBeCloseTo(0.3, 2)
    expect(dated(null, '2029-06-01')?.extent).toBeCloseTo(0.5, 1)
    expect(dated('2019-12-01', null)).toMatchObject({ state: 'lapsed' })
    expect(dated('2019-12-01', null)?.extent).toBeCloseTo(2, 1)
  })

  it('is never, or nothing, by its record', () => {
    const none = { inspectedOn: null, dueOn: null }
    expect(inspectionStateOf({ ...none, inspectionRecord: 'never' }, TODAY, 5)?.state).toBe('never')
    expect(inspectionStateOf({ ...none, inspectionRecord: 'unknown' }, TODAY, 5)).toBeNull()
    expect(inspectionStateOf({ ...none, inspectionRecord: 'dated' }, TODAY, 5)).toBeNull()
  })

  it.each([
    ['in date', 0, 0],
    ['in date', 1, 0.5],
    ['lapsed', 1, 0.7],
    ['lapsed', 30, 2],
    ['never', 0, 3],
  ] as const)('%s by %d gives %d steps', (state, extent, steps) => {
    expect(inspectionSteps({ state, extent }, rows)).toBeCloseTo(steps, 12)
  })
})

describe('eras', () => {
  const stock = [0.2, 0.2, 0.2, 0.1, 0.1, 0.1, 0.1]
  const weights = (from: number | null, to: number | null) =>
    eraWeights({ from, to, about: false }, stock, 2026)

  it('place a year', () => {
    expect([1700, 1919, 1920, 1945, 1946, 1965, 1966, 1980, 1992, 2008, 2030].map(eraOf)).toEqual([
      0, 0, 1, 1, 2, 2, 3, 4, 5, 6, 6,
    ])
    expect([1930, 1946, 2008].map(wiringPeriodOf)).toEqual([0, 1, 5])
  })

  it('weigh an interval by its years', () => {
    expect(weights(1930, 1930)).toEqual([0, 1, 0, 0, 0, 0, 0])
    const [, interwar, after] = weights(1940, 1949)
    expect(interwar).toBeCloseTo(0.6, 12)
    expect(after).toBeCloseTo(0.4, 12)
  })

  it('weigh an open interval by the stock of its years', () => {
    expect(weights(null, null).map((weight) => Math.round(weight * 1000) / 1000)).toEqual(stock)
    const [oldest, interwar, next] = weights(null, 1932)
    expect(oldest).toBeCloseTo(0.2 / 0.3, 12)
    expect(interwar).toBeCloseTo(0.1 / 0.3, 12)
    expect(next).toBe(0)
    expect(weights(2010, null).at(-1)).toBeCloseTo(1, 12)
  })

  it('add to 1 even for a year that has not come or an interval turned round', () => {
    for (const [from, to] of [
      [2030, 2030],
      [2030, null],
      [1950, 1940],
      [null, 1700],
      [1700, null],
    ] as const) {
      const given = weights(from, to)
      expect(given.length).toBe(ERAS.length)
      expect(given.reduce((sum, weight) => sum + weight, 0)).toBeCloseTo(1, 12)
    }
  })
})
