/** A step that failed in a way that the reader can act on: what happened, what to do, and where the details are. */
import { existsSync, readFileSync } from 'node:fs'

export class Trouble extends Error {
  /**
   * @param {string} message what failed
   * @param {{ advice?: string, log?: string }} [more] what to do, and the log file that holds the details
   */
  constructor(message, { advice, log } = {}) {
    super(message)
    this.name = 'Trouble'
    this.advice = advice
    this.log = log
  }
}

/** A line longer than this is a whole statement or a whole page, and its ends say enough [characters]. */
const LONGEST = 320

const shortened = (line) =>
  line.length > LONGEST ? `${line.slice(0, LONGEST / 2)} … ${line.slice(-LONGEST / 2)}` : line

/** The last lines of a log file that say something: no frames of a stack, no blank ones, none too long to read. */
export function lastLines(file, count = 15) {
  if (!file || !existsSync(file)) return []
  const says = (line) => line.trim() && !/^\s+at .*[:)]|^node:internal/.test(line)
  return readFileSync(file, 'utf8').split('\n').filter(says).slice(-count).map(shortened)
}
