import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as patches from '@/db/repositories/patches'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { patchName, withFreeName } from './patch-name'

export const RenamePatch = z.object({ patchId: z.uuid('Choose a patch.'), name: patchName })

/**
 * Renames a patch; homes and people stay with it.
 * @throws NotFound where the organisation has no such patch, Invalid where another has the name
 */
export async function renamePatch(
  actor: Actor,
  { patchId, name }: z.output<typeof RenamePatch>,
): Promise<void> {
  demand(actor, 'organisation.manage')
  await withFreeName(
    inTransaction(actor, async (scope) => {
      const before = await patches.getById(scope, patchId)
      if (before.name === name) return
      await patches.rename(scope, patchId, name)
      const subject = { subjectKind: 'patch', subjectId: patchId }
      await audit.record(scope, {
        actorId: actor.personId,
        did: 'patch.renamed',
        ...subject,
        detail: { name: [before.name, name] },
      })
    }),
  )
}
