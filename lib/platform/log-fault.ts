/** Faults go to the log under an id; the person sees the id and nothing else. */
import { randomBytes } from 'node:crypto'
import { log } from './log'

type DatabaseError = { errno?: number; code?: string }

/**
 * Logs what went wrong, without the values that a database error quotes in its message.
 * @returns the id that the person can quote [10 characters]
 */
export function logFault(thrown: unknown, where: string): string {
  const fault = randomBytes(5).toString('hex')
  const error = thrown instanceof Error ? thrown : new Error('something that is no error was thrown')
  const { errno, code } = error as DatabaseError
  const frames = error.stack?.split('\n').filter((line) => /^\s+at /.test(line))
  log().error({
    fault,
    where,
    kind: error.name,
    errno,
    code,
    reason: errno === undefined ? error.message : undefined,
    frames: frames?.slice(0, 12).map((line) => line.trim()),
  })
  return fault
}
