import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as organisations from '@/db/repositories/organisations'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { nation, organisationName } from '@/lib/organisations/organisation'

const DAYS = 'Enter a whole number of days from 1 to 365.'

export const ChangeSettings = z.object({
  name: organisationName,
  nation,
  noticeDays: z
    .string({ error: DAYS })
    .trim()
    .regex(/^\d{1,3}$/, DAYS)
    .transform(Number)
    .refine((days) => days >= 1 && days <= 365, DAYS),
})

/** Changes the organisation's name, nation, and the days before a report's end from which it is due. */
export async function changeSettings(actor: Actor, input: z.output<typeof ChangeSettings>): Promise<void> {
  demand(actor, 'organisation.manage')
  await inTransaction(actor, async (scope) => {
    const before = await organisations.get(scope)
    await organisations.update(scope, input)
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'organisation.settings-changed',
      subjectKind: 'organisation',
      subjectId: actor.organisationId,
      detail: {
        nation: [before.nation, input.nation],
        noticeDays: [before.noticeDays, input.noticeDays],
        nameChanged: before.name !== input.name,
      },
    })
  })
}
