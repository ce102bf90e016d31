import { z } from 'zod'
import { inTransaction, type WritingScope } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as homeFacts from '@/db/repositories/home-facts'
import * as homes from '@/db/repositories/homes'
import * as inspections from '@/db/repositories/inspections'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type FieldProblem, Invalid } from '@/lib/errors/expected'
import { FACT_KINDS, type FactKind } from '@/lib/homes/fact'
import { readFactValue } from '@/lib/homes/fact-value'
import { newId } from '@/lib/platform/new-id'
import { agreeOnBoard } from './agree-on-board'
import { gatherDates, optionalDay, optionalPartialDate } from './date-fields'
import { homeOf, IDENTITY_FIELDS, positionProblems } from './home-identity'
import { refreshHomes } from './refresh-homes'

const factFields = Object.fromEntries(
  FACT_KINDS.map((kind) => [kind, z.string().max(120).optional()]),
) as Record<FactKind, z.ZodOptional<z.ZodString>>

/** One home by a form: who and where it is, and as much of its wiring as is known, each fact under its kind's name. */
export const AddHome = z.preprocess(
  gatherDates(['inspectedOn', 'nextDueOn']),
  z.object({
    ...IDENTITY_FIELDS,
    ...factFields,
    inspectedOn: optionalPartialDate('The date of the last inspection'),
    nextDueOn: optionalDay('The next inspection date'),
  }),
)
export type AddHome = z.output<typeof AddHome>

type GivenFact = { readonly kind: FactKind; readonly value: string; readonly asOf: null; readonly note: null }

function check(input: AddHome, today: CalendarDay): GivenFact[] {
  const problems: FieldProblem[] = [...positionProblems(input)]
  const facts: GivenFact[] = []
  for (const kind of FACT_KINDS)
    try {
      const { text } = readFactValue(kind, input[kind] ?? null)
      if (text !== null) facts.push({ kind, value: text, asOf: null, note: null })
    } catch (thrown) {
      if (!(thrown instanceof Invalid)) throw thrown
      problems.push(...thrown.problems)
    }
  const { inspectedOn, nextDueOn } = input
  if (inspectedOn && inspectedOn.day > today)
    problems.push({
      field: 'inspectedOn',
      problem: 'The date of the last inspection cannot lie in the future.',
    })
  if (inspectedOn && input['inspection-record'] === 'never')
    problems.push({
      field: 'inspectedOn',
      problem: 'A home that was never inspected has no date of a last inspection.',
    })
  if (nextDueOn && !inspectedOn)
    problems.push({
      field: 'nextDueOn',
      problem: 'Give the date of the last inspection too: the next date is counted with it.',
    })
  if (nextDueOn && inspectedOn && nextDueOn <= inspectedOn.day)
    problems.push({
      field: 'nextDueOn',
      problem: 'The next inspection date must lie after the last inspection.',
    })
  if (problems.length > 0) throw new Invalid(problems)
  return facts
}

async function write(
  scope: WritingScope,
  actor: Actor,
  input: AddHome,
  given: readonly GivenFact[],
  today: CalendarDay,
): Promise<{ homeId: string }> {
  const { inspectedOn, nextDueOn } = input
  const {
    kind,
    address,
    town,
    postcode,
    reference,
    uprn,
    nation,
    tenure,
    patch,
    block,
    latitude,
    longitude,
    note,
  } = input
  const identity = {
    kind,
    address,
    town,
    postcode,
    reference,
    uprn,
    nation,
    tenure,
    patch,
    block,
    latitude,
    longitude,
    note,
  }
  const home = await homeOf(scope, actor, newId(), identity)
  await homes.insertMany(scope, [home])
  const recorded = { homeId: home.id, source: 'officer' as const, recordedBy: actor.personId }
  const facts = agreeOnBoard(given, new Map())
  await homeFacts.insertMany(
    scope,
    facts.map((fact) => ({
      ...fact,
      ...recorded,
      id: newId(),
      asOf: { day: today, precision: 'day' as const },
    })),
  )
  if (inspectedOn)
    await inspections.insertMany(scope, [
      { ...recorded, id: newId(), inspectedOn, assessment: null, nextDueOn: nextDueOn ?? null, note: null },
    ])
  await refreshHomes(scope, [home.id], today)
  await audit.record(scope, {
    actorId: actor.personId,
    did: 'home.added',
    subjectKind: 'home',
    subjectId: home.id,
    detail: { facts: facts.map((fact) => fact.kind), inspectedOn: inspectedOn?.day ?? null },
  })
  return { homeId: home.id }
}

/**
 * Adds one home to the register, with what is known of it, and scores it at once.
 * @throws NotAllowed; NotFound where the patch is none; Invalid where a value is none or the home is there already
 */
export async function addHome(actor: Actor, input: AddHome, today: CalendarDay): Promise<{ homeId: string }> {
  demand(actor, 'homes.add')
  const facts = check(input, today)
  return inTransaction(actor, (scope) => write(scope, actor, input, facts, today))
}
