/** What an import changes of homes that are known already. */
import { beforeEach, describe, expect, it } from 'vitest'
import { inTransaction, reading } from '@/db/connection'
import { listKnown } from '@/db/repositories/home-intake'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { type HomeDraft } from '@/lib/imports/home-draft'
import { createDraftApplier } from '@/lib/use-cases/imports/apply-drafts'
import { type AnOrganisation, anOrganisation } from '@/tests/builders/an-organisation'

const today = calendarDay('2026-12-01')
let own: AnOrganisation

const draft = (changes: Partial<HomeDraft> = {}): HomeDraft => ({
  row: 2,
  kind: 'dwelling',
  reference: 'R-1',
  uprn: '100099000005',
  address: '1 Anchor Row',
  town: null,
  postcode: 'ZX1 1AA',
  addressKey: '1 anchor row|zx11aa',
  block: null,
  patch: 'North',
  nation: null,
  tenure: 'social-rent',
  built: { from: 1931, to: 1931, about: false },
  dwellingType: 'mid-terrace',
  bedrooms: 3,
  boardType: 'rewireable',
  rcdCover: 'none',
  ways: null,
  wiring: 'unknown',
  rewired: null,
  inspectionRecord: 'dated',
  lastInspection: { day: calendarDay('2020-03-14'), precision: 'day' },
  assessment: 'unsatisfactory',
  nextDue: null,
  open: { C1: 0, C2: 2, C3: null, FI: null },
  latitude: null,
  longitude: null,
  note: null,
  ...changes,
})

async function apply(...drafts: HomeDraft[]) {
  const clashes: string[] = []
  const changes: string[] = []
  const homes = await inTransaction(own.manager, async (scope) => {
    const applier = await createDraftApplier(scope, {
      actorId: own.manager.personId,
      source: 'list.csv',
      nation: 'england',
      today,
      onClash: (row, why) => clashes.push(`${row}: ${why}`),
      onChange: (row, { field, from, to }) => changes.push(`${field}: ${from} to ${to}`),
    })
    await applier.apply(drafts)
    return { ...(await applier.finish()), kept: applier.kept() }
  })
  return { ...homes, clashes, changes }
}

async function known() {
  const scope = reading(own.manager)
  const ids = (await scope.db('homes').where('organisation_id', own.organisationId).select('id')) as {
    id: string
  }[]
  return [
    ...(
      await listKnown(
        scope,
        ids.map(({ id }) => id),
      )
    ).values(),
  ]
}

beforeEach(async () => {
  own = await anOrganisation()
})

describe('applying drafts', () => {
  it('adds a home with its facts, inspection and defects', async () => {
    expect(await apply(draft())).toMatchObject({ added: 1, changed: 0, unchanged: 0 })
    const [home] = await known()
    expect(home?.facts.get('board-type')).toMatchObject({ value: 'rewireable', source: 'import' })
    expect(home?.facts.has('wiring')).toBe(false)
    expect(home?.inspections).toHaveLength(1)
    expect(home?.openDefects).toEqual({ C1: 0, C2: 2, C3: 0, FI: 0 })
  })

  it('changes nothing the second time, whatever the case of a patch', async () => {
    await apply(draft())
    expect(await apply(draft({ patch: ' NORTH' }))).toMatchObject({
      added: 0,
      changed: 0,
      unchanged: 1,
      kept: {},
    })
  })

  it('supersedes an imported fact and keeps the older one', async () => {
    await apply(draft())
    expect(await apply(draft({ boardType: 'breakers' }))).toMatchObject({ changed: 1 })
    const rows = (await reading(own.manager)
      .db('home_facts')
      .where({ organisation_id: own.organisationId, kind: 'board-type' })
      .orderBy('id')
      .select('value', 'is_current')) as { value: string; is_current: number | null }[]
    expect(rows).toEqual([
      { value: 'rewireable', is_current: null },
      { value: 'breakers', is_current: 1 },
    ])
  })

  it('never un-knows a fact', async () => {
    await apply(draft())
    expect(await apply(draft({ boardType: 'unknown', tenure: 'unknown' }))).toMatchObject({ unchanged: 1 })
    expect((await known())[0]?.facts.get('board-type')?.value).toBe('rewireable')
  })

  it('keeps an officer’s word against the file, and says so', async () => {
    await apply(draft())
    await reading(own.manager)
      .db('home_facts')
      .where({ organisation_id: own.organisationId, kind: 'board-type' })
      .update({ source: 'officer' })
    const result = await apply(draft({ boardType: 'rcbo' }))
    expect(result).toMatchObject({ unchanged: 1, kept: { 'Consumer unit': 1 } })
  })

  it('adds the defects that are missing and closes none', async () => {
    await apply(draft())
    await apply(draft({ open: { C1: 1, C2: 1, C3: null, FI: null } }))
    expect((await known())[0]?.openDefects).toEqual({ C1: 1, C2: 2, C3: 0, FI: 0 })
  })

  it('tells what changed of an address or a tenure', async () => {
    await apply(draft())
    expect((await apply(draft({ tenure: 'affordable-rent' }))).changes).toEqual([
      'tenure: social-rent to affordable-rent',
    ])
  })

  it('refuses a row whose UPRN and reference belong to two homes', async () => {
    await apply(
      draft(),
      draft({ row: 3, reference: 'R-2', uprn: '100099000006', address: '2 Anchor Row', addressKey: '2' }),
    )
    const result = await apply(draft({ reference: 'R-2' }))
    expect(result.clashes).toEqual([
      '2: its UPRN and its reference belong to two different homes in the register',
    ])
    expect(result).toMatchObject({ added: 0, changed: 0 })
  })

  it('does not find another organisation’s home', async () => {
    await apply(draft())
    own = await anOrganisation()
    expect(await apply(draft())).toMatchObject({ added: 1 })
    expect(await known()).toHaveLength(1)
  })

  it('leaves nothing behind where it dies half way', async () => {
    const dying = inTransaction(own.manager, async (scope) => {
      const applier = await createDraftApplier(scope, {
        actorId: null,
        source: 'x',
        nation: 'england',
        today,
      })
      await applier.apply([draft()])
      await applier.finish()
      throw new Error('the process died')
    })
    await expect(dying).rejects.toThrow('died')
    expect(await known()).toHaveLength(0)
  })
})
