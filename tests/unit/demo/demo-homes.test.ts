import { beforeAll, describe, expect, it } from 'vitest'
import { type DemoHome } from '@/db/seeds/portfolio/demo-home'
import { DEMO_PASSWORD } from '@/db/seeds/portfolio/demo-people'
import { DEMO_ORGANISATIONS, demoHomes } from '@/db/seeds/portfolio/demo-portfolio'
import { passwordProblem } from '@/lib/access/password-problem'
import { ROLES } from '@/lib/access/role'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { daysBetween } from '@/lib/calendar/days-between'
import { boardTypeOfWays } from '@/lib/electrical/board-type-of-ways'
import { waysOf } from '@/lib/electrical/consumer-unit'
import { type FactKind } from '@/lib/homes/fact'
import { readFactValue } from '@/lib/homes/fact-value'
import { factsOfDraft } from '@/lib/imports/merge-draft'

/**
 * The strict shape of a postcode.
 * @source BS 7666: letters allowed in each place, as summarised by the Cabinet Office's schema (from memory)
 */
const POSTCODE =
  /^(?:GIR 0AA|(?:[A-PR-UWYZ](?:\d{1,2}|[A-HK-Y]\d{1,2}|\d[A-HJKPSTUW]|[A-HK-Y]\d[ABEHMNPRVWXY])) \d[ABD-HJLNP-UW-Z]{2})$/

const TODAY = calendarDay('2026-12-01')
/** What the register holds last of a kind, or what the stock list says. */
const lastOf = (home: DemoHome, kind: FactKind) =>
  [...home.inspections.flatMap(({ facts }) => facts), ...home.corrections].findLast(
    (fact) => fact.kind === kind,
  ) ??
  factsOfDraft(home.draft)
    .map(([of, value]) => ({ kind: of, value }))
    .find((fact) => fact.kind === kind)

describe.each([TODAY, calendarDay('2028-02-29')])('the demo on %s', (today) => {
  let provider: readonly DemoHome[]
  let landlord: readonly DemoHome[]
  beforeAll(() => {
    const homes = demoHomes(today)
    provider = homes['larrowside-homes']
    landlord = homes['tai-aberllinos']
  }, 60_000)
  const share = (fits: (home: DemoHome) => boolean) => provider.filter(fits).length / provider.length

  it('has about 2,400 homes and three', () => {
    expect(provider.length).toBeGreaterThan(2_300)
    expect(provider.length).toBeLessThan(2_500)
    expect(landlord).toHaveLength(3)
  })

  it('has no two homes with one UPRN, reference or address, and every postcode keeps to BS 7666 in areas that do not exist', () => {
    for (const homes of [provider, landlord])
      for (const field of ['uprn', 'reference', 'addressKey'] as const) {
        const values = homes.flatMap(({ draft }) => draft[field] ?? [])
        expect(new Set(values).size).toBe(values.length)
      }
    const drafts = [...provider, ...landlord].map(({ draft }) => draft)
    expect(drafts.filter(({ postcode }) => !POSTCODE.test(postcode ?? ''))).toEqual([])
    expect(drafts.filter(({ postcode }) => !/^(?:ZX|YX|WX|UX)/.test(postcode ?? ''))).toEqual([])
    expect(drafts.filter(({ uprn }) => uprn !== null && !/^99\d{10}$/.test(uprn))).toEqual([])
  })

  it('holds only facts that the register can read', () => {
    for (const home of [...provider, ...landlord]) {
      for (const [kind, value] of factsOfDraft(home.draft)) readFactValue(kind, value)
      for (const fact of [...home.inspections.flatMap(({ facts }) => facts), ...home.corrections])
        readFactValue(fact.kind, fact.value)
    }
    expect(() => readFactValue('ways', 'R[')).toThrow() // the check can fail
  })

  it('draws in every report the board that it names', () => {
    const reports = provider.flatMap(({ inspections }) => inspections)
    const amiss = reports.filter(({ facts }) => {
      const of = (kind: FactKind) => facts.find((fact) => fact.kind === kind)?.value ?? ''
      return boardTypeOfWays(waysOf(of('ways')) ?? []) !== of('board-type')
    })
    expect(amiss).toEqual([])
    expect(reports.length).toBeGreaterThan(1_000)
  })

  it('has some of everything: rewireable boards in about one home of seven, unknown ones in about one of twelve', () => {
    const board = (home: DemoHome) => lastOf(home, 'board-type')?.value ?? 'unknown'
    const rewireable = share((home) => ['rewireable', 'mixed'].includes(board(home)))
    expect(rewireable).toBeGreaterThan(0.11)
    expect(rewireable).toBeLessThan(0.18)
    const unknown = share((home) => board(home) === 'unknown')
    expect(unknown).toBeGreaterThan(0.05)
    expect(unknown).toBeLessThan(0.11)
    expect(new Set(provider.map(board))).toEqual(
      new Set(['rewireable', 'cartridge', 'breakers', 'rcbo', 'mixed', 'unknown']),
    )
  })

  it('has more rewireable boards in older homes, as the trade would expect', () => {
    const old = (home: DemoHome) => (home.draft.built.to ?? 9_999) < 1965
    const young = (home: DemoHome) => (home.draft.built.from ?? 0) > 1995
    const rewireable = (homes: readonly DemoHome[]) =>
      homes.filter((home) => lastOf(home, 'board-type')?.value === 'rewireable').length / homes.length
    expect(rewireable(provider.filter(old))).toBeGreaterThan(0.1)
    expect(rewireable(provider.filter(young))).toBeLessThan(0.01)
  })

  it('knows no inspection of tomorrow, and has a hump of reports that end within five months', () => {
    const ages = provider.flatMap(({ draft, inspections }) => {
      const on = inspections.at(-1)?.inspectedOn ?? draft.lastInspection
      return on ? [daysBetween(on.day, today)] : []
    })
    expect(Math.min(...ages)).toBeGreaterThan(0)
    const between = (from: number, to: number) => ages.filter((age) => age >= from && age < to).length
    expect(between(1_676, 1_826)).toBeGreaterThan(1.4 * between(1_376, 1_526))
    expect(between(1_827, 9_999)).toBeGreaterThan(80)
    expect(share(({ draft }) => draft.inspectionRecord === 'never')).toBeGreaterThan(0.005)
    expect(provider.some(({ draft }) => draft.lastInspection?.precision === 'year')).toBe(true)
    expect(provider.some(({ draft }) => draft.lastInspection?.precision === 'month')).toBe(true)
  })

  it('has a few open C1, and open defects of every code', () => {
    const open = provider.flatMap(({ inspections }) =>
      inspections.flatMap(({ defects }) => defects.filter(({ closed }) => !closed)),
    )
    const count = (code: string) => open.filter((defect) => defect.code === code).length
    expect(count('C1')).toBe(5)
    expect(count('C2')).toBeGreaterThan(40)
    expect(count('FI')).toBeGreaterThan(5)
    expect(count('C3')).toBeGreaterThan(100)
    const closings = provider.flatMap(({ inspections }) =>
      inspections.flatMap(({ defects }) => defects.flatMap(({ closed }) => (closed ? [closed.on] : []))),
    )
    expect(closings.filter((on) => on >= today)).toEqual([])
    expect(closings.length).toBeGreaterThan(100)
  })

  it('plays its scenes: corrections by an officer, landlord supplies, leases, a long address, homes without a place', () => {
    expect(provider.filter(({ corrections }) => corrections.length > 0).length).toBeGreaterThan(30)
    expect(provider.filter(({ draft }) => draft.kind === 'communal').length).toBeGreaterThan(10)
    expect(provider.some(({ draft }) => draft.tenure === 'shared-ownership')).toBe(true)
    expect(provider.some(({ draft }) => draft.tenure === 'leasehold')).toBe(true)
    expect(provider.some(({ draft }) => draft.address.length > 90)).toBe(true)
    expect(share(({ draft }) => draft.latitude === null)).toBeGreaterThan(0.01)
    expect(provider.some(({ corrections }) => corrections.some(({ value }) => value === null))).toBe(true)
  })
})

describe('the people of the demo', () => {
  it('hold every role in each organisation, at example domains, with a password that sign-up would take', () => {
    for (const { people } of DEMO_ORGANISATIONS) {
      expect(new Set(people.map(({ role }) => role))).toEqual(new Set(ROLES))
      for (const person of people) {
        expect(person.email).toMatch(/\.example$/)
        expect(passwordProblem(DEMO_PASSWORD, person)).toBeNull()
      }
    }
    const emails = DEMO_ORGANISATIONS.flatMap(({ people }) => people.map(({ email }) => email))
    expect(new Set(emails).size).toBe(emails.length)
  })

  it('are the same on the same day', () => {
    expect(JSON.stringify(demoHomes(TODAY))).toBe(JSON.stringify(demoHomes(TODAY)))
  }, 60_000)
})
