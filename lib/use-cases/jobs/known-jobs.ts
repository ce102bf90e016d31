import { applyImportJob } from '@/lib/use-cases/imports/apply-import'
import { checkImportJob } from '@/lib/use-cases/imports/check-import'
import { rescoreJob } from '@/lib/use-cases/homes/rescore-job'
import { type Job } from './job'

/** Every job that the worker knows, by kind. */
export const KNOWN_JOBS: ReadonlyMap<string, Job> = new Map(
  [checkImportJob, applyImportJob, rescoreJob].map((job) => [job.kind, job]),
)
