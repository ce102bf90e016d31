import { z } from 'zod'
import { inTransaction, type WritingScope } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as homeFacts from '@/db/repositories/home-facts'
import * as homes from '@/db/repositories/homes'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { Conflict, type FieldProblem, Invalid } from '@/lib/errors/expected'
import { FACT_KINDS, FACT_NAMES, type FactKind } from '@/lib/homes/fact'
import { readFactValue } from '@/lib/homes/fact-value'
import { newId } from '@/lib/platform/new-id'
import { agreeOnBoard } from './agree-on-board'
import { gatherDates, optionalPartialDate } from './date-fields'
import { refreshHomes } from './refresh-homes'
import { optionalLine } from './text-fields'

const Kind = z.enum(FACT_KINDS, 'Choose what it is that you want to correct.')

/** Corrections of a home's facts. `value` null: it is known that this is not known. */
export const RecordFact = z.object({
  homeId: z.uuid(),
  facts: z
    .array(
      z.object({
        kind: Kind,
        value: z.string().trim().max(120, 'Use 120 characters or fewer.').nullable(),
        asOf: optionalPartialDate('The date of this fact'),
        note: optionalLine(300),
      }),
    )
    .min(1, 'Change at least one fact.'),
  /** the ids of the facts that were on screen, by kind; null where there was none */
  seen: z.partialRecord(Kind, z.uuid().nullable()).default({}),
})
export type RecordFact = z.output<typeof RecordFact>

const seenField = z.union([z.literal('').transform(() => null), z.uuid()]).optional()
const valueField = z.string().optional()
const ofKinds = <Field extends z.ZodType>(prefix: string, field: Field) =>
  Object.fromEntries(FACT_KINDS.map((kind) => [`${prefix}${kind}`, field])) as Record<string, Field>

/**
 * The same from a form: a field for each kind by its name, `seen-` and the kind with the id that was on screen,
 * and `asOf` and `note` for all of them. A kind without a field is left as it is.
 */
export const RecordFactForm = z.preprocess(
  gatherDates(['asOf']),
  z
    .object({
      homeId: z.uuid(),
      asOf: optionalPartialDate('The date'),
      note: optionalLine(300),
    })
    .and(z.object({ ...ofKinds('', valueField) }))
    .and(z.object({ ...ofKinds('seen-', seenField) }))
    .transform(({ homeId, asOf, note, ...fields }): RecordFact => {
      const given = fields as Record<string, string | null | undefined>
      return {
        homeId,
        facts: FACT_KINDS.flatMap((kind) => {
          const value = given[kind]
          return value === undefined ? [] : [{ kind, value, asOf, note }]
        }),
        seen: Object.fromEntries(
          FACT_KINDS.flatMap((kind) => {
            const id = given[`seen-${kind}`]
            return id === undefined ? [] : [[kind, id]]
          }),
        ),
      }
    }),
)

type Correction = {
  readonly kind: FactKind
  readonly value: string | null
  readonly asOf: PartialDate | null
  readonly note: string | null
}

/** Each value as the register keeps it. @throws Invalid with every value that is none of its kind, or lies ahead */
function corrections({ facts }: RecordFact, today: CalendarDay): Correction[] {
  const problems: FieldProblem[] = []
  const read: Correction[] = []
  for (const { kind, value, asOf, note } of facts) {
    if (read.some((one) => one.kind === kind))
      problems.push({ field: kind, problem: `${FACT_NAMES[kind]} is given twice.` })
    if (asOf && asOf.day > today)
      problems.push({ field: 'asOf', problem: 'The date of a fact cannot lie in the future.' })
    try {
      const { text } = readFactValue(kind, value)
      if ((kind === 'rewired' || kind === 'built') && (text?.match(/\d{4}/)?.[0] ?? '') > today.slice(0, 4))
        problems.push({ field: kind, problem: `${FACT_NAMES[kind]}: that year lies in the future.` })
      read.push({ kind, value: text, asOf: asOf ?? null, note })
    } catch (thrown) {
      if (!(thrown instanceof Invalid)) throw thrown
      problems.push(...thrown.problems)
    }
  }
  if (problems.length > 0) throw new Invalid(problems)
  return read
}

function refuseWhereMovedOn(
  current: ReadonlyMap<FactKind, homeFacts.HomeFact>,
  seen: RecordFact['seen'],
): void {
  const moved = FACT_KINDS.filter(
    (kind) => seen[kind] !== undefined && seen[kind] !== (current.get(kind)?.id ?? null),
  )
  if (moved.length > 0)
    throw new Conflict(
      `${moved.map((kind) => FACT_NAMES[kind]).join(', ')}: somebody else has changed this since you opened the page. Read it again, then decide.`,
    )
}

async function write(
  scope: WritingScope,
  actor: Actor,
  input: RecordFact,
  today: CalendarDay,
): Promise<{ recorded: FactKind[] }> {
  const home = await homes.getForChange(scope, reachOf(actor), input.homeId)
  demand(actor, 'homes.edit', home)
  const current = new Map((await homeFacts.listCurrent(scope, [home.id])).map((fact) => [fact.kind, fact]))
  const given = corrections(input, today)
  refuseWhereMovedOn(current, input.seen)
  const changes = agreeOnBoard(given, current).filter(
    ({ kind, value }) => (current.get(kind)?.value ?? null) !== value,
  )
  if (changes.length === 0)
    throw new Invalid([
      {
        field: given[0]?.kind ?? '',
        problem: 'That is what the register holds already, so nothing was changed.',
      },
    ])
  await homeFacts.supersede(
    scope,
    changes.flatMap(({ kind }) => current.get(kind) ?? []),
  )
  await homeFacts.insertMany(
    scope,
    changes.map((change) => ({
      ...change,
      id: newId(),
      homeId: home.id,
      source: 'officer' as const,
      asOf: change.asOf ?? { day: today, precision: 'day' as const },
      recordedBy: actor.personId,
    })),
  )
  await refreshHomes(scope, [home.id], today)
  for (const { kind, value } of changes)
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'home.fact-recorded',
      subjectKind: 'home',
      subjectId: home.id,
      detail: { kind, from: current.get(kind)?.value ?? null, to: value },
    })
  return { recorded: changes.map(({ kind }) => kind) }
}

/**
 * An officer's correction: the facts before it stay as history, the derived row and the score follow at once.
 * Ways set the board's type and cover with them.
 * @throws NotFound, NotAllowed; Invalid where a value is none, contradicts the ways or changes nothing;
 * Conflict where a fact is no longer the one that was seen
 */
export async function recordFact(
  actor: Actor,
  input: RecordFact,
  today: CalendarDay,
): Promise<{ recorded: FactKind[] }> {
  demand(actor, 'homes.edit')
  return inTransaction(actor, (scope) => write(scope, actor, input, today))
}
