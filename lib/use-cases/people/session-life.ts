/** How long a session lives. Judgement: a working day's pause, and a week at most. */

/** A session ends this long after its last use [h] */
export const IDLE_HOURS = 12
/** A session ends this long after it began, however much it is used [d] */
export const SESSION_DAYS = 7

const HOUR = 3_600_000

/** When a session that began at `begun` and is used at `used` ends unless it is used again. */
export function sessionEnd(begun: Date, used: Date): Date {
  return new Date(Math.min(used.getTime() + IDLE_HOURS * HOUR, begun.getTime() + SESSION_DAYS * 24 * HOUR))
}
