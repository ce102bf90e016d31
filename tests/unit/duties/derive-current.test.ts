import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { calendarDay as d } from '@/lib/calendar/calendar-day'
import { deriveCurrent } from '@/lib/duties/derive-current'
import { type InspectionOnRecord, latestInspection } from '@/lib/duties/latest-inspection'
import { Invalid } from '@/lib/errors/expected'
import { type Fact, type FactKind } from '@/lib/homes/fact'
import { anyDay, anyPartialDate } from '../calendar/any-day'

const none = { C1: 0, C2: 0, C3: 0, FI: 0 }
const fact = (kind: FactKind, value: string | null, asOf?: string): Fact => ({
  kind,
  value,
  source: 'import',
  asOf: asOf === undefined ? null : { day: d(asOf), precision: 'day' },
  note: null,
})
const inspection = (day: string, rest: Partial<InspectionOnRecord> = {}): InspectionOnRecord => ({
  inspectedOn: { day: d(day), precision: 'day' },
  assessment: null,
  nextDueOn: null,
  ...rest,
})
const home = (facts: Fact[], inspections: InspectionOnRecord[] = []) =>
  deriveCurrent({ nation: 'england', facts, inspections, openDefects: none })

describe('the current view of a home', () => {
  it('knows nothing where nothing is on record', () => {
    expect(home([])).toEqual({
      nation: 'england',
      boardType: 'unknown',
      rcdCover: 'unknown',
      ways: null,
      built: { from: null, to: null, about: false },
      dwellingType: 'unknown',
      wiring: 'unknown',
      rewired: null,
      bedrooms: null,
      inspectionRecord: 'unknown',
      inspectedOn: null,
      assessment: null,
      dueOn: null,
      decidedBy: null,
      open: none,
    })
  })

  it('reads every kind of fact', () => {
    const facts = [
      fact('board-type', 'rewireable'),
      fact('rcd-cover', 'none'),
      fact('ways', 'RRRRRU'),
      fact('built', '~1895/1905'),
      fact('dwelling-type', 'mid-terrace'),
      fact('wiring', 'rubber'),
      fact('rewired', '1974'),
      fact('bedrooms', '3'),
    ]
    expect(
      deriveCurrent({ nation: 'wales', facts, inspections: [], openDefects: { ...none, C2: 2 } }),
    ).toMatchObject({
      nation: 'wales',
      boardType: 'rewireable',
      rcdCover: 'none',
      ways: 'RRRRRU',
      built: { from: 1895, to: 1905, about: true },
      dwellingType: 'mid-terrace',
      wiring: 'rubber',
      rewired: 1974,
      bedrooms: 3,
      open: { C1: 0, C2: 2, C3: 0, FI: 0 },
    })
  })

  it('takes date, outcome and due day from the latest inspection alone', () => {
    const current = home(
      [],
      [
        inspection('2016-03-14', { assessment: 'satisfactory', nextDueOn: d('2017-03-14') }),
        inspection('2024-03-14', { assessment: 'unsatisfactory', nextDueOn: d('2027-03-14') }),
        inspection('2021-03-14', { assessment: 'satisfactory' }),
      ],
    )
    expect(current).toMatchObject({
      inspectionRecord: 'dated',
      inspectedOn: { day: '2024-03-14', precision: 'day' },
      assessment: 'unsatisfactory',
      dueOn: '2027-03-14',
      decidedBy: 'report',
    })
  })

  it('does not borrow an outcome from an older report', () => {
    const current = home(
      [],
      [inspection('2021-03-14', { assessment: 'satisfactory' }), inspection('2024-03-14')],
    )
    expect(current.assessment).toBeNull()
    expect(current.dueOn).toBe('2029-03-14')
  })

  it('counts a home as never inspected only where nothing says otherwise', () => {
    expect(home([fact('inspection-record', 'never')]).inspectionRecord).toBe('never')
    expect(home([fact('inspection-record', 'never')], [inspection('2024-03-14')]).inspectionRecord).toBe(
      'dated',
    )
    expect(home([fact('inspection-record', 'reported')]).inspectionRecord).toBe('unknown')
    expect(home([fact('inspection-record', null)]).inspectionRecord).toBe('unknown')
  })

  it('applies the rule of the home’s nation and sector', () => {
    const inspections = [inspection('2021-12-14')]
    expect(deriveCurrent({ nation: 'wales', facts: [], inspections, openDefects: none }).dueOn).toBe(
      '2026-12-13',
    )
    expect(
      deriveCurrent({
        nation: 'northern-ireland',
        sector: 'social',
        facts: [],
        inspections,
        openDefects: none,
      }).dueOn,
    ).toBe('2026-12-14')
  })

  it('refuses a stored value that is none of its kind', () => {
    expect(() => home([fact('wiring', 'string')])).toThrow(Invalid)
  })
})

describe('a board from facts of different times', () => {
  it('is filled from the ways where the type is not known', () => {
    expect(home([fact('ways', 'RRBB')])).toMatchObject({
      boardType: 'mixed',
      rcdCover: 'unknown',
      ways: 'RRBB',
    })
    expect(home([fact('ways', '[BBBB]')])).toMatchObject({ boardType: 'breakers', rcdCover: 'all' })
    expect(home([fact('board-type', 'breakers'), fact('ways', 'BBBU')])).toMatchObject({
      boardType: 'breakers',
      ways: 'BBBU',
    })
  })

  it('keeps the RCD cover that was stated, which is finer than the ways can show', () => {
    expect(home([fact('rcd-cover', 'sockets'), fact('ways', 'RRR[BB]')]).rcdCover).toBe('sockets')
    expect(home([fact('rcd-cover', null), fact('ways', 'RRR[BB]')]).rcdCover).toBe('part')
  })

  it('follows the later of type and ways where they contradict each other', () => {
    expect(
      home([fact('board-type', 'breakers', '2024-05-01'), fact('ways', 'RRRR', '2016-03-14')]),
    ).toMatchObject({ boardType: 'breakers', ways: null })
    expect(
      home([fact('board-type', 'rewireable', '2016-03-14'), fact('ways', 'BBBB', '2024-05-01')]),
    ).toMatchObject({ boardType: 'breakers', ways: 'BBBB' })
  })

  it.each([
    ['breakers', 'RRRR', 'rewireable', 'RRRR'],
    ['rewireable', 'BBBB', 'rewireable', null],
    ['rewireable', 'RRBB', 'mixed', 'RRBB'],
    ['rcbo', 'BBOO', 'breakers', 'BBOO'],
    ['cartridge', 'BBBB', 'cartridge', null],
  ])('takes the worse news where neither is later: %s and %s make %s, %s', (type, ways, boardType, kept) => {
    expect(home([fact('board-type', type), fact('ways', ways)])).toMatchObject({ boardType, ways: kept })
  })
})

describe('the latest inspection', () => {
  it('is none where there is none', () => {
    expect(latestInspection([])).toBeNull()
  })

  it('prefers a day to a month to a year that begin together, then the worse news', () => {
    const year = inspection('2021-01-01', { inspectedOn: { day: d('2021-01-01'), precision: 'year' } })
    const good = inspection('2021-01-01', { assessment: 'satisfactory' })
    const bad = inspection('2021-01-01', { assessment: 'unsatisfactory' })
    const sooner = inspection('2021-01-01', { assessment: 'unsatisfactory', nextDueOn: d('2022-01-01') })
    expect(latestInspection([year, good])).toBe(good)
    expect(latestInspection([good, bad, year])).toBe(bad)
    expect(latestInspection([bad, sooner, good])).toBe(sooner)
  })

  it('does not depend on the order in which inspections are given', () => {
    const anyInspection = fc.record({
      inspectedOn: anyPartialDate,
      assessment: fc.constantFrom('satisfactory' as const, 'unsatisfactory' as const, null),
      nextDueOn: fc.option(anyDay),
    })
    fc.assert(
      fc.property(fc.array(anyInspection, { minLength: 1, maxLength: 6 }), (inspections) => {
        const latest = latestInspection(inspections)
        expect(latestInspection([...inspections].reverse())).toEqual(latest)
        expect(inspections.every((one) => one.inspectedOn.day <= (latest?.inspectedOn.day ?? ''))).toBe(true)
      }),
    )
  })
})
