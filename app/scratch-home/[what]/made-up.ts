import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { FACT_KINDS, type FactKind } from '@/lib/homes/fact'
import { type HomeRow } from '@/lib/homes/home-row'
import { assess } from '@/lib/risk/assess'
import { FIRST_METHOD } from '@/lib/risk/first-method'
import { intervalRule, ruleCitation } from '@/lib/duties/interval-rules'
import { type FactShown, type HomeShown } from '@/components/homes/home-shown'

const day = (t: string) => t as CalendarDay
const at = new Date('2026-06-30T23:30:00Z')
const fact = (kind: FactKind, value: string | null, extra: Partial<FactShown> = {}): FactShown => ({ id: kind, kind, value, source: 'inspection', asOf: { day: day('2016-03-14'), precision: 'day' }, note: null, recordedBy: 'Ada Marsh', recordedAt: at, ...extra })

export function shownOf(what: string): HomeShown {
  const bare = what === 'bare'
  const long = what === 'long'
  const good = what === 'good'
  const home: HomeRow = {
    id: '018f0000-0000-7000-8000-000000000001', kind: 'dwelling', reference: bare ? null : 'MEH-00412', uprn: bare ? null : '100099004121',
    address: long ? 'The Old Harbourmaster’s and Customs Officers’ Residence, Flat 14 (Upper Maisonette), Llanfairpwllgwyngyllgogerychwyrndrobwll House, 14 Capstan Row' : '14 Capstan Row',
    town: bare ? null : 'Quillhaven', postcode: bare ? null : 'ZX1 4AB', patch: bare ? null : { id: '018f0000-0000-7000-8000-000000000002', name: 'Ferry Bank' }, block: bare ? null : { id: '018f0000-0000-7000-8000-000000000003', name: 'Capstan House' },
    nation: long ? 'wales' : good ? 'scotland' : 'england', tenure: bare ? 'unknown' : long ? 'leasehold' : 'social-rent', built: bare ? { from: null, to: null, about: false } : { from: 1931, to: 1931, about: false },
    dwellingType: bare ? 'unknown' : 'mid-terrace', bedrooms: 3, boardType: bare ? 'unknown' : good ? 'breakers' : 'rewireable', rcdCover: bare ? 'unknown' : good ? 'all' : 'none', ways: bare ? null : good ? '[BBBB][BBO]XX' : 'RRRRRU', wiring: bare ? 'unknown' : 'unknown', rewired: null,
    inspectionRecord: bare ? 'never' : 'dated', inspectedOn: bare ? null : { day: day(good ? '2025-03-14' : '2016-03-14'), precision: 'day' }, assessment: 'unsatisfactory', dueOn: bare ? null : day(good ? '2030-03-14' : '2021-03-14'), standing: bare ? 'never inspected' : good ? 'in date' : 'lapsed',
    open: bare || good ? { C1: 0, C2: 0, C3: 0, FI: 0 } : { C1: 1, C2: 2, C3: 1, FI: 1 }, score: 0, scoreLow: 0, scoreHigh: 0, place: bare ? null : { latitude: 54.2, longitude: 2.1 },
  }
  const assessment = assess(home, FIRST_METHOD, day('2026-12-01'))
  const rule = intervalRule(home.nation, 'social')
  const facts = FACT_KINDS.map((kind) => {
    const value = bare ? null : ({ 'board-type': home.boardType, 'rcd-cover': home.rcdCover, ways: home.ways, built: '1931', 'dwelling-type': 'mid-terrace', bedrooms: '3' } as Record<string, string | null>)[kind] ?? null
    return { kind, current: value === null && kind !== 'wiring' ? null : fact(kind, value, kind === 'built' ? { source: 'import', note: 'stock list 2026.xlsx, row 412', recordedBy: null } : {}), before: kind === 'board-type' && !bare ? [fact(kind, 'breakers', { id: 'b1', source: 'import', asOf: { day: day('2014-01-01'), precision: 'year' } }), fact(kind, null, { id: 'b2', source: 'officer', asOf: null })] : [] }
  })
  const d = { recordedBy: 'Ada Marsh', recordedAt: at, source: 'inspection' as const, closedOn: null, closedNote: null, closedBy: null }
  return {
    home, note: bare ? null : long ? 'Meter cupboard is behind the false panel under the stairs, the key hangs with the caretaker of Capstan House. '.repeat(4) : 'Meter under the stairs. Ring twice.',
    standing: { reason: bare ? 'On record as never inspected; an inspection is owed every five years at least (SI 2020/312 as amended by SI 2025/1043, reg 3(2)), so one is needed now.' : 'Inspected 14 March 2016; a report covers five years at most (SI 2020/312 as amended by SI 2025/1043, reg 3(2)), so it lapsed after 14 March 2021.', rule, citation: ruleCitation(rule), decidedBy: bare ? null : 'law', isOwed: !long },
    facts, inspections: bare ? [] : [{ id: 'i1', inspectedOn: { day: day('2016-03-14'), precision: 'day' }, assessment: 'unsatisfactory', nextDueOn: day('2021-03-14'), source: 'import', note: 'EICR 2016-0412, Harbour Electrical', withdrawnAt: null, recordedBy: null, recordedAt: at }, { id: 'i2', inspectedOn: { day: day('2011-05-01'), precision: 'month' }, assessment: null, nextDueOn: null, source: 'officer', note: null, withdrawnAt: at, recordedBy: 'Tom Reed', recordedAt: at }],
    openDefects: bare || good ? [] : [
      { ...d, id: 'd1', code: 'C1', description: 'Live parts can be touched at a broken socket outlet', location: 'Kitchen, beside the cooker', raisedOn: { day: day('2026-11-30'), precision: 'day' } },
      { ...d, id: 'd2', code: 'C2', description: 'No main bonding to the gas service', location: null, raisedOn: { day: day('2016-03-14'), precision: 'day' } },
      { ...d, id: 'd3', code: 'C2', description: 'Cable insulation perished at the ceiling roses throughout; brittle rubber', location: 'Upstairs lighting', raisedOn: { day: day('2016-03-01'), precision: 'month' } },
      { ...d, id: 'd4', code: 'FI', description: 'Circuit 6 could not be traced', location: null, raisedOn: null },
      { ...d, id: 'd5', code: 'C3', description: 'No RCD on sockets that may feed equipment outdoors', location: null, raisedOn: { day: day('2016-03-14'), precision: 'day' } }],
    closedDefects: bare ? [] : [{ ...d, id: 'd9', code: 'C2', description: 'Loose neutral at the main switch', location: 'Consumer unit', raisedOn: { day: day('2016-03-14'), precision: 'day' }, closedOn: day('2016-04-02'), closedBy: 'Tom Reed', closedNote: 'Re-terminated by Harbour Electrical, minor works certificate 881.' }],
    assessment: { ...assessment }, rank: { place: bare ? 112 : 1, of: 2412 },
    scoreHistory: ['2026-09-01', '2026-10-01', '2026-11-01', '2026-11-30'].map((on, i) => ({ on: day(on), score: assessment.score * (0.1 + 0.3 * i), low: assessment.low * (0.1 + 0.3 * i), high: assessment.high * (0.1 + 0.3 * i), methodVersion: '1' })),
    neighbours: bare ? null : { homes: 11, withRewireableWays: 4, unknown: 2, lapsed: 1 }, mayEdit: what !== 'reader',
  }
}
