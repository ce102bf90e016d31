/** MariaDB asks for another try where two transactions meet; this is the one place that gives it. */

/** 1020 record changed under snapshot isolation, 1205 lock wait timeout, 1213 deadlock */
const AGAIN = new Set([1020, 1205, 1213])
const TRIES = 5

const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds))

/** Whether a thrown value is the database asking for another try. */
export const asksForAnotherTry = (thrown: unknown): boolean =>
  typeof thrown === 'object' && thrown !== null && AGAIN.has((thrown as { errno?: number }).errno ?? 0)

/** Runs the work, and again up to five times with growing, jittered pauses where the database asks for it. */
export async function retrying<T>(work: () => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await work()
    } catch (thrown) {
      if (attempt >= TRIES || !asksForAnotherTry(thrown)) throw thrown
      await pause(10 * 2 ** attempt * (0.5 + Math.random()))
    }
  }
}
