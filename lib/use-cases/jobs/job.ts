/** What a job is to the worker. Types only. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'

export type JobContext = {
  readonly organisationId: string
  readonly payload: Readonly<Record<string, unknown>>
  readonly today: CalendarDay
  /** Call it now and then: keeps the lease, notes progress, and throws where another worker has taken over. */
  readonly progress: (done: number, total: number | null) => Promise<void>
}

/** A job is safe to run again: a worker may die at any step of it. */
export type Job = {
  readonly kind: string
  readonly run: (context: JobContext) => Promise<void>
  /** told when the job is given up, so that what waits for it can say so */
  readonly giveUp?: (context: JobContext, why: string) => Promise<void>
}
