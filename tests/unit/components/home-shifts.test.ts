import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { nextFactOf } from '@/components/homes/home-next-fact'
import { layOutShifts } from '@/components/homes/home-shift-track'
import { assess } from '@/lib/risk/assess'
import { type Shift } from '@/lib/risk/assessment'
import { FIRST_METHOD } from '@/lib/risk/first-method'
import { stepsBetween } from '@/lib/risk/likelihood-scale'
import { A_BARE_HOME, A_KNOWN_HOME, TODAY } from './home-shown-example'

const shift = (steps: number, unknown = false, fact: Shift['fact'] = 'wiring'): Shift => ({
  fact,
  steps,
  unknown,
  reason: `${fact} ${steps}`,
  basis: 'judgement',
  source: 'test',
})

describe('the shifts of a hazard', () => {
  it('puts what is known first, the largest first, and lays each piece where the one before ended', () => {
    const { placed } = layOutShifts([shift(0.5, true), shift(-1), shift(2.25)])
    expect(placed.map(({ shift: { steps }, from, to }) => [steps, from, to])).toEqual([
      [2.25, 0, 2.25],
      [-1, 2.25, 1.25],
      [0.5, 1.25, 1.75],
    ])
  })

  it('holds every piece between its ends, and ends at the sum of the steps', () => {
    const steps = fc.double({ min: -8, max: 8, noNaN: true })
    fc.assert(
      fc.property(fc.array(fc.tuple(steps, fc.boolean()), { maxLength: 12 }), (given) => {
        const track = layOutShifts(given.map(([size, unknown]) => shift(size, unknown)))
        for (const { from, to } of track.placed) {
          expect(Math.min(from, to)).toBeGreaterThanOrEqual(track.least)
          expect(Math.max(from, to)).toBeLessThanOrEqual(track.most)
        }
        const sum = given.reduce((total, [size]) => total + size, 0)
        expect(track.placed.at(-1)?.to ?? 0).toBeCloseTo(sum, 9)
      }),
    )
  })

  it('ends at the likelihood that the table shows under it', () => {
    // a step is the fourth root of ten: SI 2006/1702 (W.164), regulation 6, Table 1
    for (const hazard of assess(A_KNOWN_HOME, FIRST_METHOD, TODAY).hazards) {
      const end = layOutShifts(hazard.shifts).placed.at(-1)?.to ?? 0
      expect(end).toBeCloseTo(stepsBetween(hazard.base.oneIn, hazard.oneIn), 6)
    }
  })
})

describe('the fact to find out next', () => {
  it('is the unknown one that moves furthest, never a known one', () => {
    const next = nextFactOf({
      shifts: [shift(7, false, 'defects'), shift(0.4, true, 'wiring'), shift(-0.9, true, 'rcd-cover')],
    })
    expect(next?.what).toContain('RCD')
  })

  it('is none where nothing is unknown', () => {
    expect(nextFactOf({ shifts: [shift(2)] })).toBeNull()
  })

  it('has words for every fact that the method can find unknown', () => {
    const [hazard] = assess(A_BARE_HOME, FIRST_METHOD, TODAY).hazards
    const unknown = hazard?.shifts.filter((one) => one.unknown) ?? []
    expect(unknown.length).toBeGreaterThan(4)
    for (const one of unknown) expect(nextFactOf({ shifts: [one] }), one.fact).not.toBeNull()
  })
})
