import { z } from 'zod'
import { inTransaction, type WritingScope } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as defects from '@/db/repositories/defects'
import * as homes from '@/db/repositories/homes'
import * as inspections from '@/db/repositories/inspections'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { addYears } from '@/lib/calendar/add-years'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Conflict, type FieldProblem, Invalid } from '@/lib/errors/expected'
import { CLASSIFICATION_CODES, type ClassificationCode } from '@/lib/homes/classification-code'
import { newId } from '@/lib/platform/new-id'
import { gatherDates, optionalDay, partialDateField } from './date-fields'
import { refreshHomes } from './refresh-homes'
import { optionalLine } from './text-fields'

const observed = (code: ClassificationCode) =>
  z.preprocess(
    (given) => (given === '' || given === undefined || given === null ? 0 : given),
    z.coerce
      .number(`Write how many ${code} observations there are as a whole number, or leave it empty.`)
      .int(`Write how many ${code} observations there are as a whole number, or leave it empty.`)
      .min(0, `The number of ${code} observations cannot be below 0.`)
      .max(99, `99 ${code} observations are more than a report of one home can hold.`),
  )

/** What an officer takes from a report: its date, what it says overall, its next date, and how many observations it has. */
export const RecordInspection = z.preprocess(
  gatherDates(['inspectedOn', 'nextDueOn']),
  z.object({
    homeId: z.uuid(),
    inspectedOn: partialDateField('The date of the inspection'),
    assessment: z.preprocess(
      (given) => (given === '' || given === 'unknown' || given === undefined ? null : given),
      z.enum(['satisfactory', 'unsatisfactory'], 'Choose what the report says overall.').nullable(),
    ),
    nextDueOn: optionalDay('The next inspection date'),
    C1: observed('C1'),
    C2: observed('C2'),
    C3: observed('C3'),
    FI: observed('FI'),
    note: optionalLine(300),
  }),
)
export type RecordInspection = z.output<typeof RecordInspection>

/** No report asks for its next inspection later than this after it; a longer one is a slip of the keyboard [years]. */
const LONGEST_TERM = 20

function check(input: RecordInspection, today: CalendarDay): void {
  const { inspectedOn, nextDueOn, assessment } = input
  const problems: FieldProblem[] = []
  if (inspectedOn.day > today)
    problems.push({ field: 'inspectedOn', problem: 'The date of the inspection cannot lie in the future.' })
  if (nextDueOn && nextDueOn <= inspectedOn.day)
    problems.push({ field: 'nextDueOn', problem: 'The next inspection date must lie after the inspection.' })
  if (nextDueOn && nextDueOn > addYears(inspectedOn.day, LONGEST_TERM))
    problems.push({
      field: 'nextDueOn',
      problem: `The next inspection date lies more than ${LONGEST_TERM} years after the inspection. Check its year.`,
    })
  // An installation with a C1, C2 or FI is unsatisfactory by the model forms of BS 7671 Appendix 6 (common practice).
  if (assessment === 'satisfactory' && input.C1 + input.C2 + input.FI > 0)
    problems.push({
      field: 'assessment',
      problem:
        'A report with a C1, C2 or FI observation is unsatisfactory. Check the report: one of the two was copied wrongly.',
    })
  if (problems.length > 0) throw new Invalid(problems)
}

async function write(
  scope: WritingScope,
  actor: Actor,
  input: RecordInspection,
  today: CalendarDay,
): Promise<{ inspectionId: string }> {
  const home = await homes.getForChange(scope, reachOf(actor), input.homeId)
  demand(actor, 'homes.edit', home)
  const { inspectedOn, assessment, note } = input
  const twin = (await inspections.listLive(scope, [home.id])).find(
    (one) => one.inspectedOn.day === inspectedOn.day,
  )
  if (twin) throw new Conflict('An inspection of that date is on record for this home already.')
  const inspectionId = newId()
  const shared = { homeId: home.id, source: 'officer' as const, recordedBy: actor.personId }
  await inspections.insertMany(scope, [
    { ...shared, id: inspectionId, inspectedOn, assessment, nextDueOn: input.nextDueOn ?? null, note },
  ])
  await defects.insertMany(
    scope,
    CLASSIFICATION_CODES.flatMap((code) =>
      Array.from({ length: input[code] }, () => ({
        ...shared,
        id: newId(),
        inspectionId,
        code,
        description: 'As the report has it; not described here',
        location: null,
        raisedOn: inspectedOn,
      })),
    ),
  )
  await refreshHomes(scope, [home.id], today)
  await audit.record(scope, {
    actorId: actor.personId,
    did: 'home.inspection-recorded',
    subjectKind: 'home',
    subjectId: home.id,
    detail: {
      inspectionId,
      inspectedOn: inspectedOn.day,
      precision: inspectedOn.precision,
      assessment,
      nextDueOn: input.nextDueOn ?? null,
      observations: Object.fromEntries(CLASSIFICATION_CODES.map((code) => [code, input[code]])),
    },
  })
  return { inspectionId }
}

/**
 * Puts an inspection on record, with a defect for each observation that it counts.
 * @throws NotFound, NotAllowed; Invalid where dates or counts cannot be; Conflict where that day's is on record
 */
export async function recordInspection(
  actor: Actor,
  input: RecordInspection,
  today: CalendarDay,
): Promise<{ inspectionId: string }> {
  demand(actor, 'homes.edit')
  check(input, today)
  return inTransaction(actor, (scope) => write(scope, actor, input, today))
}
