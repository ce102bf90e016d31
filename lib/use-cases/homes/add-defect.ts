import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as defects from '@/db/repositories/defects'
import * as homes from '@/db/repositories/homes'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Invalid } from '@/lib/errors/expected'
import { CLASSIFICATION_CODES } from '@/lib/homes/classification-code'
import { newId } from '@/lib/platform/new-id'
import { gatherDates, optionalPartialDate } from './date-fields'
import { refreshHomes } from './refresh-homes'
import { lines, optionalLine } from './text-fields'

/** A defect from a report or an officer's note. The code is the inspector's. */
export const AddDefect = z.preprocess(
  gatherDates(['raisedOn']),
  z.object({
    homeId: z.uuid(),
    code: z.enum(CLASSIFICATION_CODES, 'Choose the code that the inspector gave.'),
    description: lines('Say what is wrong, as the report has it.', 500),
    location: optionalLine(160),
    /** left out: today */
    raisedOn: optionalPartialDate('The date on which it was found'),
  }),
)
export type AddDefect = z.output<typeof AddDefect>

/**
 * Puts a defect on record as open; the score follows at once.
 * @throws NotFound, NotAllowed; Invalid where the date lies ahead
 */
export async function addDefect(
  actor: Actor,
  input: AddDefect,
  today: CalendarDay,
): Promise<{ defectId: string }> {
  demand(actor, 'homes.edit')
  const { code, description, location, raisedOn = { day: today, precision: 'day' } } = input
  if (raisedOn.day > today)
    throw new Invalid([
      { field: 'raisedOn', problem: 'The date on which it was found cannot lie in the future.' },
    ])
  return inTransaction(actor, async (scope) => {
    const home = await homes.getForChange(scope, reachOf(actor), input.homeId)
    demand(actor, 'homes.edit', home)
    const defectId = newId()
    await defects.insertMany(scope, [
      {
        id: defectId,
        homeId: home.id,
        inspectionId: null,
        code,
        description,
        location,
        source: 'officer',
        raisedOn,
        recordedBy: actor.personId,
      },
    ])
    await refreshHomes(scope, [home.id], today)
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'home.defect-added',
      subjectKind: 'home',
      subjectId: home.id,
      detail: { defectId, code, raisedOn: raisedOn.day },
    })
    return { defectId }
  })
}
