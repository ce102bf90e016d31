import { type Job } from '@/lib/use-cases/jobs/job'
import { rescoreOrganisation } from './rescore-organisation'

/** Scores every home of an organisation anew, a chunk at a time; running it again is harmless. */
export const rescoreJob: Job = {
  kind: 'rescore-organisation',
  run: ({ organisationId, today, progress }) => rescoreOrganisation({ organisationId }, today, progress),
}
