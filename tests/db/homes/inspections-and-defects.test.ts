/** Inspections and defects, by the forms. */
import { beforeEach, describe, expect, it } from 'vitest'
import { type z } from 'zod'
import { reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import { Conflict, Invalid } from '@/lib/errors/expected'
import { problemsOf } from '@/lib/forms/problems-of'
import { AddDefect, addDefect } from '@/lib/use-cases/homes/add-defect'
import { AddHome, addHome } from '@/lib/use-cases/homes/add-home'
import { CloseDefect, closeDefect } from '@/lib/use-cases/homes/close-defect'
import { RecordInspection, recordInspection } from '@/lib/use-cases/homes/record-inspection'
import { showHome } from '@/lib/use-cases/homes/show-home'
import { anOrganisation, type AnOrganisation } from '@/tests/builders/an-organisation'
import { TODAY } from './some-homes'

let organisation: AnOrganisation

beforeEach(async () => {
  organisation = await anOrganisation()
})

const LEAST = { address: '1 Herring Row', postcode: 'ZX1 2AB', nation: 'england' }
const add = (given: Record<string, string> = {}) =>
  addHome(organisation.manager, AddHome.parse({ ...LEAST, ...given }), TODAY)
const shown = (homeId: string) => showHome(organisation.manager, homeId, TODAY)
const fieldsOf = (act: Promise<unknown>) =>
  act.then(
    () => 'no problem',
    (thrown: unknown) => (thrown instanceof Invalid ? thrown.problems.map((one) => one.field) : thrown),
  )
const problems = (schema: z.ZodType, given: unknown) => {
  const { error } = schema.safeParse(given)
  return error ? problemsOf(error) : []
}
const lastAct = async () => (await audit.list(reading(organisation.manager), { limit: 1 }))[0]

describe('an inspection', () => {
  const record = (homeId: string, given: Record<string, string>) =>
    recordInspection(organisation.officer, RecordInspection.parse({ homeId, ...given }), TODAY)
  const inNorth = async () =>
    (await add({ patch: organisation.patches.north, 'inspection-record': 'never' })).homeId
  const REPORT = { 'inspectedOn-day': '1', 'inspectedOn-month': 'June', 'inspectedOn-year': '2026' }

  it('brings its date, its next date, and a defect for each observation', async () => {
    const homeId = await inNorth()
    expect((await shown(homeId)).home.standing).toBe('never inspected')
    await record(homeId, {
      ...REPORT,
      assessment: 'unsatisfactory',
      'nextDueOn-day': '1',
      'nextDueOn-month': '6',
      'nextDueOn-year': '2027',
      C1: '1',
      C2: '2',
      C3: '',
    })
    const { home, inspections, openDefects, standing } = await shown(homeId)
    expect(home).toMatchObject({
      inspectionRecord: 'dated',
      dueOn: '2027-06-01',
      standing: 'in date',
      assessment: 'unsatisfactory',
      open: { C1: 1, C2: 2, C3: 0, FI: 0 },
    })
    expect(inspections).toMatchObject([
      { inspectedOn: { day: '2026-06-01', precision: 'day' }, recordedBy: organisation.officer.name },
    ])
    expect(openDefects.map((defect) => defect.code)).toEqual(['C1', 'C2', 'C2'])
    expect(standing).toMatchObject({ decidedBy: 'report', reason: expect.stringMatching(/sooner/) })
  })

  it('known to the year counts from the first day of it', async () => {
    const homeId = await inNorth()
    await record(homeId, { 'inspectedOn-year': '2022' })
    expect((await shown(homeId)).home).toMatchObject({
      inspectedOn: { day: '2022-01-01', precision: 'year' },
      dueOn: '2027-01-01',
      standing: 'due',
    })
  })

  it('of a day that is on record is refused', async () => {
    const homeId = await inNorth()
    await record(homeId, REPORT)
    await expect(record(homeId, REPORT)).rejects.toBeInstanceOf(Conflict)
    expect((await shown(homeId)).inspections).toHaveLength(1)
  })

  it.each<[Record<string, string>, string[]]>([
    [{ inspectedOn: '2026-12-02' }, ['inspectedOn']],
    [{ ...REPORT, nextDueOn: '2026-06-01' }, ['nextDueOn']],
    [{ ...REPORT, nextDueOn: '2066-06-01' }, ['nextDueOn']],
    [{ ...REPORT, assessment: 'satisfactory', C2: '1' }, ['assessment']],
  ])('with %j is refused', async (given, fields) => {
    expect(await fieldsOf(record(await inNorth(), given))).toEqual(fields)
  })

  it('says in plain words what is wrong with a field', () => {
    expect(
      problems(RecordInspection, {
        homeId: organisation.organisationId,
        C1: 'two',
        assessment: 'fine',
        'nextDueOn-year': '2027',
      }),
    ).toEqual([
      { field: 'inspectedOn', problem: 'The date of the inspection is missing.' },
      { field: 'assessment', problem: 'Choose what the report says overall.' },
      { field: 'nextDueOn', problem: 'The next inspection date needs its day and month too.' },
      {
        field: 'C1',
        problem: 'Write how many C1 observations there are as a whole number, or leave it empty.',
      },
    ])
  })
})

describe('a defect', () => {
  it('raises the score while it is open, and stays on record when it is closed', async () => {
    const { homeId } = await add({ patch: organisation.patches.north })
    const before = (await shown(homeId)).home.score
    const { defectId } = await addDefect(
      organisation.officer,
      AddDefect.parse({
        homeId,
        code: 'C1',
        description: 'Bare conductor at the socket',
        location: 'Kitchen',
        'raisedOn-day': '1',
        'raisedOn-month': '11',
        'raisedOn-year': '2026',
      }),
      TODAY,
    )
    expect((await shown(homeId)).home.score).toBeGreaterThan(before)
    const close = (given: Record<string, string>) =>
      closeDefect(
        organisation.officer,
        CloseDefect.parse({ homeId, defectId, note: 'Socket replaced, certificate seen', ...given }),
        TODAY,
      )
    expect(await fieldsOf(close({ closedOn: '2026-10-31' }))).toEqual(['closedOn'])
    expect(await fieldsOf(close({ closedOn: '2026-12-02' }))).toEqual(['closedOn'])
    await close({ closedOn: '2026-11-02' })
    const after = await shown(homeId)
    expect(after.home).toMatchObject({ open: { C1: 0 }, score: before })
    expect(after.closedDefects).toMatchObject([
      {
        code: 'C1',
        closedOn: '2026-11-02',
        closedNote: 'Socket replaced, certificate seen',
        closedBy: organisation.officer.name,
      },
    ])
    await expect(close({ closedOn: '2026-11-03' })).rejects.toBeInstanceOf(Conflict)
    expect(await lastAct()).toMatchObject({ did: 'home.defect-closed', detail: { code: 'C1' } })
  })

  it('needs a code, words, a day and a note', () => {
    const homeId = organisation.organisationId
    expect(problems(AddDefect, { homeId, code: 'C4', description: '' }).map((one) => one.field)).toEqual([
      'code',
      'description',
    ])
    expect(
      problems(CloseDefect, {
        homeId,
        defectId: homeId,
        'closedOn-month': '11',
        'closedOn-year': '2026',
        note: ' ',
      }).map((one) => one.field),
    ).toEqual(['closedOn', 'note'])
  })
})
