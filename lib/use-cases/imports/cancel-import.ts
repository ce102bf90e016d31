import { z } from 'zod'
import { inTransaction, reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as imports from '@/db/repositories/imports'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { Conflict } from '@/lib/errors/expected'
import { removeFile } from '@/lib/gateways/files'

export const CancelImport = z.object({ importId: z.uuid() })

/** Drops an import that has not been confirmed, and its file. */
export async function cancelImport(actor: Actor, input: z.infer<typeof CancelImport>) {
  demand(actor, 'imports.run')
  const found = await imports.getById(reading(actor), input.importId)
  await inTransaction(actor, async (scope) => {
    if (!(await imports.move(scope, found.id, ['uploaded', 'checked', 'failed'], 'cancelled')))
      throw new Conflict('This import can no longer be cancelled.')
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'import.cancelled',
      subjectKind: 'import',
      subjectId: found.id,
    })
  })
  await removeFile(found.fileKey)
  return { id: found.id }
}
