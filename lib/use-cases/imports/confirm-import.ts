import { z } from 'zod'
import { inTransaction } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import * as imports from '@/db/repositories/imports'
import * as jobs from '@/db/repositories/jobs'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { Conflict } from '@/lib/errors/expected'

export const ConfirmImport = z.object({ importId: z.uuid() })

/** Confirms a checked file, and starts taking it in. Confirming twice starts it once. */
export async function confirmImport(actor: Actor, input: z.infer<typeof ConfirmImport>) {
  demand(actor, 'imports.run')
  return inTransaction(actor, async (scope) => {
    const found = await imports.getById(scope, input.importId)
    const attempt = found.attempt + 1
    if (!(await imports.move(scope, found.id, ['checked'], 'importing', { attempt })))
      throw new Conflict('This import has moved on. Load the page again to see where it is.')
    await jobs.enqueue(scope, {
      kind: 'apply-import',
      businessKey: `${found.id}:${attempt}`,
      payload: { importId: found.id, actorId: actor.personId },
    })
    await audit.record(scope, {
      actorId: actor.personId,
      did: 'import.confirmed',
      subjectKind: 'import',
      subjectId: found.id,
    })
    return { id: found.id }
  })
}
