import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as defects from '@/db/repositories/defects'
import * as homes from '@/db/repositories/homes'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Conflict, Invalid } from '@/lib/errors/expected'
import { dayField, gatherDates } from './date-fields'
import { refreshHomes } from './refresh-homes'
import { lines } from './text-fields'

/** That a defect was put right: when, and how that is known. */
export const CloseDefect = z.preprocess(
  gatherDates(['closedOn']),
  z.object({
    homeId: z.uuid(),
    defectId: z.uuid(),
    closedOn: dayField('The date on which it was put right'),
    note: lines('Say what was done, by whom, and what proves it.', 500),
  }),
)
export type CloseDefect = z.output<typeof CloseDefect>

/**
 * Closes a defect; it stays on record with its note, and the score follows at once.
 * @throws NotFound, NotAllowed; Invalid where the date cannot be; Conflict where it is closed already
 */
export async function closeDefect(actor: Actor, input: CloseDefect, today: CalendarDay): Promise<void> {
  demand(actor, 'homes.edit')
  return inTransaction(actor, async (scope) => {
    const home = await homes.getForChange(scope, reachOf(actor), input.homeId)
    demand(actor, 'homes.edit', home)
    const defect = await defects.getForChange(scope, home.id, input.defectId)
    if (defect.closedOn !== null) throw new Conflict('That defect is closed already.')
    const refuse = (problem: string) => {
      throw new Invalid([{ field: 'closedOn', problem }])
    }
    if (input.closedOn > today) refuse('The date on which it was put right cannot lie in the future.')
    if (defect.raisedOn && input.closedOn < defect.raisedOn.day)
      refuse('The date on which it was put right lies before the day on which it was found.')
    await defects.close(scope, [defect], { on: input.closedOn, note: input.note, by: actor.personId })
    await refreshHomes(scope, [home.id], today)
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'home.defect-closed',
      subjectKind: 'home',
      subjectId: home.id,
      detail: { defectId: defect.id, code: defect.code, closedOn: input.closedOn },
    })
  })
}
