import { z } from 'zod'
import { inTransaction, type WritingScope } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as homes from '@/db/repositories/homes'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Invalid } from '@/lib/errors/expected'
import { homeOf, IDENTITY_FIELDS, positionProblems } from './home-identity'
import { refreshHomes } from './refresh-homes'

/** Who and where a home is, all of it: what the form leaves empty becomes empty. */
export const ChangeHome = z.object({ homeId: z.uuid(), ...IDENTITY_FIELDS })
export type ChangeHome = z.output<typeof ChangeHome>

/** Fields whose old and new values the audit trail may hold; of the others it says only that they changed. */
const TOLD: readonly (keyof homes.Home)[] = [
  'kind',
  'reference',
  'uprn',
  'postcode',
  'nation',
  'tenure',
  'patchId',
  'blockId',
]

async function write(
  scope: WritingScope,
  actor: Actor,
  input: ChangeHome,
  today: CalendarDay,
): Promise<{ changed: string[] }> {
  const { homeId, ...identity } = input
  const before = await homes.getForChange(scope, reachOf(actor), homeId)
  demand(actor, 'homes.edit', before)
  const after = await homeOf(scope, actor, homeId, identity)
  const changed = (Object.keys(after) as (keyof homes.Home)[]).filter(
    (field) => after[field] !== before[field],
  )
  if (changed.length === 0) return { changed }
  await homes.update(scope, homeId, Object.fromEntries(changed.map((field) => [field, after[field]])))
  await refreshHomes(scope, [homeId], today)
  await audit.record(scope, {
    actorId: actor.personId,
    did: 'home.changed',
    subjectKind: 'home',
    subjectId: homeId,
    detail: {
      fields: changed.filter((field) => field !== 'addressKey'),
      ...Object.fromEntries(
        changed
          .filter((field) => TOLD.includes(field))
          .map((field) => [field, { from: before[field], to: after[field] }]),
      ),
    },
  })
  return { changed: changed.filter((field) => field !== 'addressKey') }
}

/**
 * Changes who and where a home is; its row in the lists, its due date and its score follow at once.
 * @throws NotFound, NotAllowed; Invalid where a value is none or belongs to another home
 */
export async function changeHome(
  actor: Actor,
  input: ChangeHome,
  today: CalendarDay,
): Promise<{ changed: string[] }> {
  demand(actor, 'homes.edit')
  const problems = positionProblems(input)
  if (problems.length > 0) throw new Invalid(problems)
  return inTransaction(actor, (scope) => write(scope, actor, input, today))
}
