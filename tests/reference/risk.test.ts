/**
 * The risk subject against what was published of the hazard-rating method. Sheets named are government (ODPM, CLG
 * 2004), IDeA (2006), Bristol City Council (2006-08) and West of England (2008) worked examples, seen in part: no
 * example shows likelihood, outcomes and score together, so most checks rest on one inferred or paired input.
 */
import { describe, expect, it } from 'vitest'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { UNKNOWN_YEAR, type YearBuilt } from '@/lib/homes/year-built'
import { assess } from '@/lib/risk/assess'
import { type Assessment, type Hazard, type RiskFacts } from '@/lib/risk/assessment'
import { type BandLetter, bandOf } from '@/lib/risk/bands'
import { FIRST_METHOD } from '@/lib/risk/first-method'
import { harmScore, scoreInWords, type SpreadOfHarm, weightOfSpread } from '@/lib/risk/harm-score'
import { LIKELIHOOD_SCALE, scalePointOf } from '@/lib/risk/likelihood-scale'
import { NATIONAL_AVERAGES } from '@/lib/risk/national-averages'
import { OUTCOME_SCALE } from '@/lib/risk/outcome-scale'

const CROWDING: SpreadOfHarm = [10, 10, 31.6, 48.4]
const COLD: SpreadOfHarm = [31.6, 4.6, 21.5, 42.3]

describe('harm score', () => {
  // printed integers: Bristol sheets 11-04, 20-03 and 2-02; [2011] UKUT 130 (LC) as commented on; an all-dwellings
  // average of excess cold. Inputs beside a score are inferred where only one scale point fits it. A second reading
  // of sheet 20-03 (1 in 100, 1/4.6/21.5/72.9) gives 217.79, which fits its 217 only if scores are cut: left out.
  it.each<[string, number, SpreadOfHarm, string]>([
    ['crowding 11-04', 3200, CROWDING, '37'],
    ['cold, Aldford', 180, COLD, '1,819'],
    ['falls 20-03', 180, [2.2, 10, 21.5, 66.3], '217'],
    ['cold 2-02', 320, COLD, '1,023'],
    ['cold, all dwellings', 340, [34, 6, 18, 42], '1,035'],
    ['lighting, average', 50_825, [0.1, 1, 10, 88.9], '<1'],
  ])('%s gives the printed score', (_, oneIn, spread, printed) => {
    expect(scoreInWords(harmScore(oneIn, spread))).toBe(printed)
  })

  // inputs printed on the sheets, no score seen: arithmetic done apart, in Python, from the published formula
  it.each<[string, number, SpreadOfHarm, number]>([
    ['crowding 11-01', 100, CROWDING, 1199.64],
    ['crowding 11-04', 3200, CROWDING, 37.4888],
    ['cold 6, after', 1800, COLD, 181.9294],
    ['gas 09-01, after', 5600, [0.5, 0, 46.6, 52.9], 3.4838],
    ['lighting 5, after', 5600, [0.1, 1, 10, 88.9], 1.0516],
    ['structure 4, after', 5600, [1, 0, 10, 89], 2.4804],
    ['certain and extreme', 1, [100, 0, 0, 0], 1_000_000],
  ])('%s agrees to four decimals', (_, oneIn, spread, score) => {
    expect(harmScore(oneIn, spread)).toBeCloseTo(score, 4)
  })
})

describe('scales', () => {
  // averages printed on the sheets, each in the printed range of its point
  it.each([
    [19_869, 5600],
    [5701, 5600],
    [400, 320],
    [340, 320],
    [226, 180],
    [409, 320],
    [1259, 1000],
    [306, 320],
    [191, 180],
    [159_528, 5600],
    [4880, 5600],
    [870, 1000],
    [50_825, 5600],
    [620, 560],
    [9010, 5600],
    [10_440, 5600],
  ])('1 in %d belongs to the point 1 in %d', (oneIn, point) => {
    expect(scalePointOf(oneIn)).toBe(point)
  })

  // SI 2006/1702 (W.164) regulation 6 Table 1 and a commentary: points step by the fourth root of ten, edges lie
  // an eighth root away; printed rounded, the commonest loosely
  it('has sixteen points that step by the fourth root of ten, as printed', () => {
    expect(LIKELIHOOD_SCALE.map(({ oneIn }) => oneIn)).toEqual([
      5600, 3200, 1800, 1000, 560, 320, 180, 100, 56, 32, 18, 10, 6, 3, 2, 1,
    ])
    LIKELIHOOD_SCALE.forEach(({ oneIn, rarer, commoner }, i) => {
      expect(oneIn / 10 ** ((15 - i) / 4)).toBeGreaterThan(0.94)
      expect(oneIn / 10 ** ((15 - i) / 4)).toBeLessThan(1.13)
      expect(rarer).toBe(i === 0 ? null : LIKELIHOOD_SCALE[i - 1]?.commoner)
      if (commoner !== null && commoner >= 7.5) {
        expect(commoner / 10 ** ((15 - i) / 4 - 1 / 8)).toBeCloseTo(1, 1)
      }
    })
  })

  // from memory; ten of the points were seen on sheets
  it('has eleven outcome points', () => {
    expect(OUTCOME_SCALE.map(({ percent }) => percent)).toEqual([
      0, 0.1, 0.2, 0.5, 1, 2.2, 4.6, 10, 21.5, 31.6, 46.4,
    ])
  })
})

describe('bands', () => {
  // letters from memory, agreeing with every banded sheet; words of 2026 and the category line from commentary
  it.each<[number, string, string, 1 | 2]>([
    [0, 'J', 'Low', 2],
    [9.99, 'J', 'Low', 2],
    [10, 'I', 'Low', 2],
    [19.99, 'I', 'Low', 2],
    [20, 'H', 'Low', 2],
    [49.99, 'H', 'Low', 2],
    [50, 'G', 'Low', 2],
    [99.99, 'G', 'Low', 2],
    [100, 'F', 'Medium', 2],
    [199.99, 'F', 'Medium', 2],
    [200, 'E', 'Medium', 2],
    [499.99, 'E', 'Medium', 2],
    [500, 'D', 'Medium', 2],
    [999.99, 'D', 'Medium', 2],
    [1000, 'C', 'High', 1],
    [1999.99, 'C', 'High', 1],
    [2000, 'B', 'High', 1],
    [4999.99, 'B', 'High', 1],
    [5000, 'A', 'High', 1],
    [1_000_000, 'A', 'High', 1],
  ])('%d is %s, and %s in England since 2026', (score, letter, word, category) => {
    expect(bandOf(score, 'wales')).toMatchObject({ name: letter, edition: '2005', category })
    expect(bandOf(score, 'england')).toMatchObject({ name: word, edition: 'england-2026', category })
    expect(bandOf(score, 'england', calendarDay('2026-06-21'))).toMatchObject({ name: letter, category })
    expect(bandOf(score, 'england', calendarDay('2026-06-22'))).toMatchObject({ name: word, category })
  })
})

describe('figures that were never printed, held within what was', () => {
  it('weighs the electrical spread so that 1 in 10 is band B (IDeA example 3)', () => {
    const { spread } = FIRST_METHOD.spreads.electrical
    expect(bandOf(harmScore(10, spread), 'wales').name).toBe('B')
    expect(weightOfSpread(spread)).toBeGreaterThanOrEqual(20_000)
    expect(weightOfSpread(spread)).toBeLessThan(50_000)
  })

  it('weighs the fire spread so that 1 in 5,701 scores the printed 17 (CLG sheet 10)', () => {
    expect(scoreInWords(harmScore(5701, FIRST_METHOD.spreads.fire.spread))).toBe('17')
  })

  it('marks as published the two averages that were seen, and no other', () => {
    const printed = NATIONAL_AVERAGES.filter(({ basis }) => basis === 'published')
    expect(printed.map(({ hazard, ageBand, kind, oneIn }) => [hazard, ageBand, kind, oneIn])).toEqual([
      ['electrical', '1920-45', 'house', 19_869],
      ['fire', 'post-1979', 'house', 5701],
    ])
  })
})

const NOTHING: RiskFacts = {
  nation: 'wales',
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
const built = (from: number, to = from): YearBuilt => ({ from, to, about: false })
const open = (counts: Partial<RiskFacts['open']>) => ({ ...NOTHING.open, ...counts })
const scored = (facts: Partial<RiskFacts>, today = '2026-12-01'): Assessment =>
  assess({ ...NOTHING, ...facts }, FIRST_METHOD, calendarDay(today))

const LETTERS = 'JIHGFEDCBA'
const bandsApart = (score: number, printed: BandLetter) =>
  Math.abs(LETTERS.indexOf(bandOf(score, 'wales').name) - LETTERS.indexOf(printed))

/** Worked examples in which wiring is a cause, as far as the register's facts can say what the sheet says. */
const EXAMPLES: [string, Hazard, BandLetter, Partial<RiskFacts>, string][] = [
  // IDeA 2006, electrical 1: 1964 house, original wiring, few kitchen sockets and trailing leads (commonly a C3)
  [
    'electrical 1',
    'electrical',
    'D',
    {
      built: built(1964),
      dwellingType: 'semi-detached',
      rewired: 1964,
      boardType: 'rewireable',
      rcdCover: 'none',
      open: open({ C3: 1 }),
    },
    '2026-12-01',
  ],
  // CLG 2004, electrical 4: 1950s end terrace, immersion heater leaking into a switch (C2, or C1 if parts are live)
  [
    'electrical 4 as C1',
    'electrical',
    'E',
    { built: built(1950, 1959), dwellingType: 'end-terrace', open: open({ C1: 1 }) },
    '2026-12-01',
  ],
  [
    'electrical 4 as C2',
    'electrical',
    'E',
    { built: built(1950, 1959), dwellingType: 'end-terrace', open: open({ C2: 1 }) },
    '2026-12-01',
  ],
  // IDeA 2006, fire 1: 1882 bedsits, no detection, old wiring (rubber, by its age)
  ['fire 1', 'fire', 'C', { built: built(1882), dwellingType: 'bedsit' }, '2026-12-01'],
  [
    'fire 1, rubber',
    'fire',
    'C',
    { built: built(1882), dwellingType: 'bedsit', wiring: 'rubber' },
    '2026-12-01',
  ],
  // Bristol 2006-08, fire 2: flat in a house of 1910, wiring over 30 years old at the time of the sheet
  ['fire 2', 'fire', 'F', { built: built(1910), dwellingType: 'flat', rewired: 1976 }, '2007-06-01'],
  // Bristol 2006-08, fire 5: 1919 bedsits on five floors, no detection, old electrics
  ['fire 5', 'fire', 'A', { built: built(1919), dwellingType: 'bedsit', wiring: 'rubber' }, '2026-12-01'],
]

describe('worked examples with electrical causes come out within one band of print', () => {
  it.each(EXAMPLES)('%s', (_, hazard, printed, facts, today) => {
    const assessment = scored(facts, today)
    const score = assessment.hazards.find((of) => of.hazard === hazard)?.score ?? Number.NaN
    expect(bandsApart(score, printed)).toBeLessThanOrEqual(1)
    expect(bandsApart(assessment.score, printed)).toBeLessThanOrEqual(1)
  })
})

// the method's own meaning: an average home scores the average
it('gives a home with all the reference features its national average', () => {
  const { hazards } = scored({
    built: built(1930),
    dwellingType: 'semi-detached',
    boardType: 'breakers',
    rcdCover: 'sockets',
    wiring: 'pvc',
    rewired: 2001,
    inspectionRecord: 'dated',
    inspectedOn: { day: calendarDay('2026-12-01'), precision: 'day' },
    dueOn: calendarDay('2031-12-01'),
  })
  expect(hazards[0]?.oneIn).toBeCloseTo(19_869, 6)
  expect(hazards[0]?.base.basis).toBe('published')
})
