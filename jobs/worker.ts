/** The worker: runs jobs, sends notices, and starts what the clock starts. Any number may run at once. */
import { randomUUID } from 'node:crypto'
import { hostname } from 'node:os'
import { startSchedule } from './schedule'
import { log } from '@/lib/platform/log'
import { KNOWN_JOBS } from '@/lib/use-cases/jobs/known-jobs'
import { runNextJob } from '@/lib/use-cases/jobs/run-next-job'
import { stopDatabase } from '@/lib/use-cases/jobs/stop-database'
import { sendNextNotice } from '@/lib/use-cases/notices/send-next-notice'

const IDLE_MILLISECONDS = 400
const owner = `${hostname()}:${process.pid}:${randomUUID().slice(0, 8)}`.slice(0, 80)
let stopping = false

const pause = () => new Promise((resolve) => setTimeout(resolve, IDLE_MILLISECONDS))

/** Does one kind of work for as long as there is some, and looks again after a short rest. */
async function keepDoing(what: string, next: () => Promise<boolean>): Promise<void> {
  while (!stopping) {
    try {
      if (await next()) continue
    } catch (thrown) {
      log().error(
        { what, error: thrown instanceof Error ? thrown.message : String(thrown) },
        'worker could not go on',
      )
    }
    await pause()
  }
}

const stopSchedule = startSchedule()
for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => (stopping = true))
log().info({ owner, jobs: [...KNOWN_JOBS.keys()] }, 'worker started')
await Promise.all([
  keepDoing('jobs', () => runNextJob(owner, KNOWN_JOBS)),
  keepDoing('notices', () => sendNextNotice(owner)),
])
stopSchedule()
await stopDatabase()
process.exit(0)
