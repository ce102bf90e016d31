import { deployment, inDeploymentTransaction } from '@/db/connection'
import * as jobs from '@/db/repositories/jobs'
import { chainedOrganisations } from '@/db/repositories/audit'
import { type CalendarDay } from '@/lib/calendar/calendar-day'

/** Queues a re-score of every organisation for a day, once however often it is asked: time since inspection counts. */
export async function queueNightlyRescore(day: CalendarDay): Promise<void> {
  for (const organisationId of await chainedOrganisations(deployment()))
    await inDeploymentTransaction(({ within }) =>
      jobs.enqueue(within(organisationId), { kind: 'rescore-organisation', businessKey: day, payload: {} }),
    )
}
