import { z } from 'zod'
import { reading } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import * as problems from '@/db/repositories/import-problems'
import * as jobs from '@/db/repositories/jobs'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { type KeptReport } from './import-report'

const PAGE = 50

export const ShowImport = z.object({
  importId: z.uuid(),
  severity: z.enum(['rejected', 'noted']).catch('rejected'),
  /** where the page before ended: row and sequence, "43.1" */
  after: z
    .string()
    .regex(/^\d{1,9}\.\d{1,5}$/)
    .optional()
    .catch(undefined),
})

const JOB_OF: Partial<Record<imports.ImportState, string>> = {
  checking: 'check-import',
  importing: 'apply-import',
}

/** One import: where it is, what it found, and a page of its problems. */
export async function showImport(actor: Actor, input: z.infer<typeof ShowImport>) {
  demand(actor, 'imports.read')
  const scope = reading(actor)
  const found = (await imports.getById(scope, input.importId)) as imports.Import<KeptReport>
  const kind = JOB_OF[found.state]
  const job = kind ? await jobs.findProgress(scope, kind, `${found.id}:${found.attempt}`) : null
  const [row, sequence] = (input.after ?? '').split('.').map(Number)
  const after = row !== undefined && sequence !== undefined ? { row, sequence } : null
  const listed = found.report
    ? await problems.list(scope, found.id, input.severity, { after, limit: PAGE + 1 })
    : []
  const page = listed.slice(0, PAGE)
  const last = page.at(-1)
  return {
    import: found,
    progress: job ? { done: job.done, total: job.total ?? found.rowsTotal } : null,
    severity: input.severity,
    problems: page,
    next: listed.length > PAGE && last ? `${last.row}.${last.sequence}` : null,
  }
}

export const ImportProgress = z.object({ importId: z.uuid() })

/** How far an import has got, for the progress bar. */
export async function showImportProgress(actor: Actor, input: z.infer<typeof ImportProgress>) {
  demand(actor, 'imports.read')
  const scope = reading(actor)
  const found = await imports.getById(scope, input.importId)
  const kind = JOB_OF[found.state]
  const job = kind ? await jobs.findProgress(scope, kind, `${found.id}:${found.attempt}`) : null
  return { state: found.state, done: job?.done ?? 0, total: job?.total ?? found.rowsTotal }
}
