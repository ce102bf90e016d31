import { z } from 'zod'
import { reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'

const PAGE = 50

export const ReadAuditTrail = z.object({
  before: z.coerce.number().int().positive().optional().catch(undefined),
  subject: z.string().max(36).optional().catch(undefined),
})

/** A page of the audit trail, newest first. */
export async function readAuditTrail(actor: Actor, input: z.infer<typeof ReadAuditTrail>) {
  demand(actor, 'audit.read')
  const scope = reading(actor)
  const entries = await audit.list(scope, { before: input.before, subjectId: input.subject, limit: PAGE + 1 })
  const shown = entries.slice(0, PAGE)
  return {
    entries: shown,
    total: await audit.count(scope),
    next: entries.length > PAGE ? (shown.at(-1)?.sequence ?? null) : null,
  }
}
