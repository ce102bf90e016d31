import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as patches from '@/db/repositories/patches'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { patchName, withFreeName } from './patch-name'

export const AddPatch = z.object({ name: patchName })

/**
 * Adds a patch to the organisation.
 * @throws Invalid where another has the name
 */
export async function addPatch(actor: Actor, { name }: z.output<typeof AddPatch>): Promise<patches.Patch> {
  demand(actor, 'organisation.manage')
  return withFreeName(
    inTransaction(actor, async (scope) => {
      const patch = await patches.insert(scope, name)
      const subject = { subjectKind: 'patch', subjectId: patch.id }
      await audit.record(scope, { actorId: actor.personId, did: 'patch.added', ...subject, detail: { name } })
      return patch
    }),
  )
}
