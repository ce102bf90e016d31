/** What the clock starts. Each start queues jobs under a key of its day, so that several workers queue them once. */
import cron from 'node-cron'
import { today } from '@/lib/platform/clock'
import { log } from '@/lib/platform/log'
import { queueNightlyRescore } from '@/lib/use-cases/homes/queue-nightly-rescore'

/** Starts the schedule; the answer stops it. Nothing is set between 01:00 and 02:00, when clocks change. */
export function startSchedule(): () => void {
  const nightly = cron.schedule(
    '15 3 * * *',
    () =>
      queueNightlyRescore(today()).catch((thrown: unknown) =>
        log().error(
          { error: thrown instanceof Error ? thrown.message : String(thrown) },
          'nightly re-score not queued',
        ),
      ),
    { timezone: 'Europe/London', noOverlap: true, name: 'nightly-rescore' },
  )
  return () => void nightly.destroy()
}
