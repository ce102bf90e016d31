/**
 * Due days worked by hand from the wording of the law, before the program computed any. The wording:
 * - England: SI 2020/312 reg 3(2), "intervals of no more than 5 years", or the interval in the most recent
 *   report where that is shorter (legislation.gov.uk/uksi/2020/312; extended to social landlords by SI 2025/1043)
 * - Wales: WSI 2022/6 reg 6(2)(b), until the end of 5 years beginning with the inspection date, or the end
 *   of the day that the report names (legislation.gov.uk/wsi/2022/6/regulation/6)
 * - Scotland: Housing (Scotland) Act 2006 s.19A; SSI 2015/272 art 3(2), 5 years from the inspection
 * - Northern Ireland: SR 2024/201 reg 3(2) (legislation.gov.uk/nisr/2024/201)
 */
import { describe, expect, it } from 'vitest'
import { addYears } from '@/lib/calendar/add-years'
import { calendarDay as d } from '@/lib/calendar/calendar-day'
import { daysBetween } from '@/lib/calendar/days-between'
import { PRECISIONS } from '@/lib/calendar/partial-date'
import { inspectionDue } from '@/lib/duties/inspection-interval'
import { INTERVAL_RULES, intervalRule, ruleCitation } from '@/lib/duties/interval-rules'
import { SECTORS } from '@/lib/duties/sector'
import { standingOf } from '@/lib/duties/standing-of'
import { NATIONS } from '@/lib/homes/nation'

const dueOn = (nation: (typeof NATIONS)[number], inspected: string, reportSays: string | null = null) =>
  inspectionDue(nation, { day: d(inspected), precision: 'day' }, reportSays === null ? null : d(reportSays))
    .dueOn

describe('the end of an interval, worked by hand', () => {
  it.each([
    // on or before the fifth anniversary
    ['england', '2021-12-14', null, '2026-12-14'],
    // a report that says the same five years changes nothing
    ['england', '2021-12-14', '2026-12-14', '2026-12-14'],
    ['scotland', '2022-02-14', null, '2027-02-14'],
    ['northern-ireland', '2025-11-25', null, '2030-11-25'],
    // five years beginning with the day itself end the day before
    ['wales', '2021-12-14', null, '2026-12-13'],
    ['wales', '2024-01-01', null, '2028-12-31'],
    ['wales', '2023-03-01', null, '2028-02-29'],
    // a shorter interval in the report holds, to the end of the day that it names
    ['england', '2024-03-14', '2027-03-14', '2027-03-14'],
    ['wales', '2024-03-14', '2025-03-14', '2025-03-14'],
    ['northern-ireland', '2025-11-25', '2026-11-25', '2026-11-25'],
    // a longer one does not
    ['england', '2021-12-14', '2031-12-14', '2026-12-14'],
    ['wales', '2021-12-14', '2026-12-14', '2026-12-13'],
    // leap day: the rule of the corresponding date (from memory); 28 February is safe in all four nations
    ['england', '2024-02-29', null, '2029-02-28'],
    ['wales', '2024-02-29', null, '2029-02-28'],
    ['scotland', '2024-02-29', null, '2029-02-28'],
    ['northern-ireland', '2024-02-29', null, '2029-02-28'],
    ['england', '2023-02-28', null, '2028-02-28'],
  ] as const)('%s, inspected %s, report says %s: %s', (nation, inspected, reportSays, expected) => {
    expect(dueOn(nation, inspected, reportSays)).toBe(expected)
  })

  it('is the last day still covered: 14 December 2026 in England, 13 December in Wales', () => {
    const standing = (nation: 'england' | 'wales', today: string) =>
      standingOf({ record: 'dated', dueOn: dueOn(nation, '2021-12-14'), today: d(today), noticeDays: 60 })
    expect(standing('england', '2026-12-14')).toBe('due')
    expect(standing('england', '2026-12-15')).toBe('lapsed')
    expect(standing('wales', '2026-12-13')).toBe('due')
    expect(standing('wales', '2026-12-14')).toBe('lapsed')
  })
})

describe('other spans worked by hand', () => {
  it('a Scottish record of 14 February 2022 is kept six years (Housing (Scotland) Act 2006 s.19B(3)(b))', () => {
    expect(addYears(d('2022-02-14'), 6)).toBe('2028-02-14')
  })

  it('a social home in England due by 31 October 2026 (SI 2025/1043, transitional) is 31 days over on 1 December', () => {
    expect(daysBetween(d('2026-10-31'), d('2026-12-01'))).toBe(31)
  })
})

describe('the table of rules', () => {
  it('has exactly one row in force for each nation and sector', () => {
    const inForce = INTERVAL_RULES.filter((rule) => rule.inForceTo === null).map(
      (rule) => `${rule.nation} ${rule.sector}`,
    )
    const wanted = NATIONS.flatMap((nation) => SECTORS.map((sector) => `${nation} ${sector}`))
    expect(inForce.sort()).toEqual(wanted.sort())
  })

  it.each([
    ['england', 'private', 'SI 2020/312, reg 3(2)', '2020-06-01'],
    ['england', 'social', 'SI 2020/312 as amended by SI 2025/1043, reg 3(2)', '2025-12-01'],
    ['wales', 'private', 'WSI 2022/6, reg 6(2)(b)', '2022-12-01'],
    ['wales', 'social', 'WSI 2022/6, reg 6(2)(b)', '2022-12-01'],
    ['scotland', 'private', 'Housing (Scotland) Act 2006, s.19A(2)', '2015-12-01'],
    ['northern-ireland', 'private', 'SR 2024/201, reg 3(2)', '2025-04-01'],
  ] as const)('cites for %s, %s: %s, in force from %s', (nation, sector, citation, from) => {
    const rule = intervalRule(nation, sector)
    expect(ruleCitation(rule)).toBe(citation)
    expect(rule.inForceFrom).toBe(from)
    expect(rule.basis).toBe('enactment')
    expect(rule.years).toBe(5)
  })

  it('claims no enactment where none was found', () => {
    expect(intervalRule('scotland', 'social').basis).toBe('standard')
    expect(intervalRule('northern-ireland', 'social').basis).toBe('practice')
  })

  it('knows three precisions of a date, each counted from its first day', () => {
    const due = PRECISIONS.map(
      (precision) => inspectionDue('england', { day: d('2021-01-01'), precision }, null).dueOn,
    )
    expect(due).toEqual(['2026-01-01', '2026-01-01', '2026-01-01'])
  })
})
