import { beforeEach, describe, expect, it } from 'vitest'
import { reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import { Conflict, Invalid } from '@/lib/errors/expected'
import { FACT_KINDS, type FactKind } from '@/lib/homes/fact'
import { AddHome, addHome } from '@/lib/use-cases/homes/add-home'
import { recordFact, RecordFact, RecordFactForm } from '@/lib/use-cases/homes/record-fact'
import { type HomeOnRecord, showHome } from '@/lib/use-cases/homes/show-home'
import { anOrganisation, type AnOrganisation } from '@/tests/builders/an-organisation'
import { TODAY } from './some-homes'

let organisation: AnOrganisation
let homeId: string

beforeEach(async () => {
  organisation = await anOrganisation()
  const form = AddHome.parse({
    address: '1 Herring Row',
    postcode: 'ZX1 2AB',
    nation: 'england',
    patch: organisation.patches.north,
    'board-type': 'breakers',
    'rcd-cover': 'none',
    built: '1931',
  })
  ;({ homeId } = await addHome(organisation.manager, form, TODAY))
})

const shown = () => showHome(organisation.manager, homeId, TODAY)
const factOf = (home: HomeOnRecord, kind: FactKind) => home.facts.find((fact) => fact.kind === kind)
const record = (
  facts: Partial<Record<FactKind, string | null>>,
  seen: RecordFact['seen'] = {},
  actor = organisation.officer,
) =>
  recordFact(
    actor,
    RecordFact.parse({
      homeId,
      facts: Object.entries(facts).map(([kind, value]) => ({ kind, value })),
      seen,
    }),
    TODAY,
  )
const problemsOf = (act: Promise<unknown>) =>
  act.then(
    () => 'no problem',
    (thrown: unknown) => (thrown instanceof Invalid ? thrown.problems.map((one) => one.field) : thrown),
  )

describe('a correction', () => {
  it('keeps what it corrects as history, with who, when and where from', async () => {
    const before = await shown()
    expect(await record({ 'board-type': 'rewireable' })).toEqual({ recorded: ['board-type'] })
    const after = await shown()
    expect(factOf(after, 'board-type')).toMatchObject({
      current: {
        value: 'rewireable',
        source: 'officer',
        recordedBy: organisation.officer.name,
        asOf: { day: TODAY, precision: 'day' },
      },
      before: [
        {
          value: 'breakers',
          recordedBy: organisation.manager.name,
          id: factOf(before, 'board-type')?.current?.id,
        },
      ],
    })
    expect(after.home.boardType).toBe('rewireable')
    expect(after.home.score).toBeGreaterThan(before.home.score)
    expect(after.assessment?.score).toBeCloseTo(after.home.score, 3)
    expect(after.scoreHistory.map(({ score }) => score)).toEqual([before.home.score, after.home.score])
  })

  it('goes on the audit trail, once a fact', async () => {
    await record({ bedrooms: '3', wiring: 'rubber' })
    const entries = await audit.list(reading(organisation.manager), { subjectId: homeId, limit: 2 })
    expect(
      entries
        .map(({ did, detail, actorId }) => ({ did, detail, actorId }))
        .toSorted((a, b) => String(a.detail.kind).localeCompare(String(b.detail.kind))),
    ).toEqual([
      {
        did: 'home.fact-recorded',
        detail: { kind: 'bedrooms', from: null, to: '3' },
        actorId: organisation.officer.personId,
      },
      {
        did: 'home.fact-recorded',
        detail: { kind: 'wiring', from: null, to: 'rubber' },
        actorId: organisation.officer.personId,
      },
    ])
  })

  it('to not known is a fact too, and never a default', async () => {
    await record({ 'board-type': null })
    const after = await shown()
    expect(factOf(after, 'board-type')?.current).toMatchObject({ value: null, source: 'officer' })
    expect(after.home.boardType).toBe('unknown')
    expect(after.assessment?.unknowns).toContain('board-type')
  })

  it('that changes nothing is refused, and leaves no trace', async () => {
    const entries = await audit.count(reading(organisation.manager))
    expect(await problemsOf(record({ 'board-type': 'breakers', bedrooms: '' }))).toEqual(['board-type'])
    expect(await audit.count(reading(organisation.manager))).toBe(entries)
    expect(factOf(await shown(), 'board-type')?.before).toEqual([])
  })

  it.each<[Partial<Record<FactKind, string>>, FactKind[]]>([
    [{ 'board-type': 'sparks' }, ['board-type']],
    [{ bedrooms: '-1', wiring: 'string' }, ['bedrooms', 'wiring']],
    [{ built: '2031' }, ['built']],
    [{ rewired: '2027' }, ['rewired']],
    [{ ways: 'RR[B' }, ['ways']],
  ])('of %j names the field', async (facts, fields) => {
    expect(await problemsOf(record(facts))).toEqual(fields)
  })

  it('cannot hold from a day in the future', async () => {
    const input = RecordFact.parse({ homeId, facts: [{ kind: 'bedrooms', value: '3', asOf: '2026-12-02' }] })
    expect(await problemsOf(recordFact(organisation.officer, input, TODAY))).toEqual(['asOf'])
  })
})

describe('two who correct at once', () => {
  it('the second is told, where it had seen the fact before', async () => {
    const seen = { 'board-type': factOf(await shown(), 'board-type')?.current?.id ?? null }
    await record({ 'board-type': 'rewireable' }, seen)
    await expect(record({ 'board-type': 'rcbo' }, seen, organisation.manager)).rejects.toBeInstanceOf(
      Conflict,
    )
    expect((await shown()).home.boardType).toBe('rewireable')
  })

  it('the second is told, where there was no fact before', async () => {
    await record({ bedrooms: '2' }, { bedrooms: null })
    await expect(record({ bedrooms: '3' }, { bedrooms: null })).rejects.toThrow(/somebody else/)
  })

  it('leave one current fact of a kind, whichever comes first', async () => {
    const seen = { 'board-type': factOf(await shown(), 'board-type')?.current?.id ?? null }
    const outcomes = await Promise.allSettled([
      record({ 'board-type': 'rewireable' }, seen),
      record({ 'board-type': 'cartridge' }, seen, organisation.manager),
    ])
    expect(outcomes.map(({ status }) => status).toSorted()).toEqual(['fulfilled', 'rejected'])
    const { current, before } = factOf(await shown(), 'board-type') ?? {}
    expect(['rewireable', 'cartridge']).toContain(current?.value)
    expect(before?.map((fact) => fact.value)).toEqual(['breakers'])
  })
})

describe('the facts of a consumer unit', () => {
  it('follow new ways', async () => {
    expect((await record({ ways: 'RRR[BB]', 'rcd-cover': null })).recorded.toSorted()).toEqual([
      'board-type',
      'rcd-cover',
      'ways',
    ])
    expect((await shown()).home).toMatchObject({ ways: 'RRR[BB]', boardType: 'mixed', rcdCover: 'part' })
  })

  it('may not contradict new ways', async () => {
    await expect(record({ ways: 'RRRR', 'board-type': 'breakers' })).rejects.toThrow(
      /4 rewireable.*“Rewireable fuses”, not “Circuit breakers”/,
    )
    expect(await problemsOf(record({ ways: '[BBBB]', 'rcd-cover': 'none' }))).toEqual(['rcd-cover'])
  })

  it('may not contradict the ways on record', async () => {
    await record({ ways: 'RRRR' })
    expect(await problemsOf(record({ 'board-type': 'rcbo' }))).toEqual(['board-type'])
    await record({ 'board-type': 'rcbo', ways: null })
    expect((await shown()).home).toMatchObject({ boardType: 'rcbo', ways: null })
  })

  it('leave a cover that no way speaks against', async () => {
    await record({ 'rcd-cover': 'sockets' })
    await record({ ways: 'BB[BB]' })
    expect((await shown()).home.rcdCover).toBe('sockets')
  })
})

describe('the form', () => {
  it('reads a field for each kind, a date in three parts and what was on screen', () => {
    const form = {
      homeId,
      'board-type': 'rewireable',
      bedrooms: '',
      'seen-board-type': homeId,
      'seen-bedrooms': '',
      'asOf-day': '',
      'asOf-month': 'Mar',
      'asOf-year': '2021',
      note: ' seen  on site ',
    }
    expect(RecordFactForm.parse(form)).toEqual({
      homeId,
      facts: [
        {
          kind: 'board-type',
          value: 'rewireable',
          asOf: { day: '2021-03-01', precision: 'month' },
          note: 'seen on site',
        },
        {
          kind: 'bedrooms',
          value: '',
          asOf: { day: '2021-03-01', precision: 'month' },
          note: 'seen on site',
        },
      ],
      seen: { 'board-type': homeId, bedrooms: null },
    })
  })

  it.each([
    [
      { 'asOf-day': '31', 'asOf-month': '2', 'asOf-year': '2021' },
      'The date does not exist in the calendar.',
    ],
    [{ 'asOf-day': '1', 'asOf-month': '', 'asOf-year': '2021' }, 'The date has a day but no month.'],
    [{ 'asOf-month': '13', 'asOf-year': '2021' }, 'The date has a month that does not exist.'],
    [{ 'asOf-year': '21' }, 'The date needs a year with four digits, such as 2021.'],
    [{ asOf: 'tomorrow' }, 'The date could not be read.'],
  ])('says what is wrong with %j', (given, message) => {
    const { error } = RecordFactForm.safeParse({ homeId, bedrooms: '2', ...given })
    expect(error?.issues.map(({ path, message: told }) => [path[0], told])).toEqual([['asOf', message]])
  })

  it('takes every kind of fact', () => {
    const form = Object.fromEntries(FACT_KINDS.map((kind) => [kind, '']))
    expect(RecordFactForm.parse({ homeId, ...form }).facts.map((fact) => fact.kind)).toEqual([...FACT_KINDS])
  })
})
