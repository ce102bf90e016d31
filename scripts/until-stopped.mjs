/** How a launcher lives and ends: told to stop, or with a dead child, it stops everything in order. */
import { Trouble } from '../db/server/trouble.mjs'
import { explain } from './steps.mjs'
import { aborted, stopSignal } from './stop-signal.mjs'

/** Stays until told to stop or until a child dies, and stops the rest either way. */
async function stay(stack, signal) {
  try {
    const trouble = await Promise.race([aborted(signal), stack.family.death])
    if (trouble) throw trouble
  } finally {
    await stack.stop()
    process.stdout.write('Stopped.\n')
  }
}

/**
 * Starts a stack, says that it is up, and keeps it until told to stop. Ends this process with the exit code that fits.
 * @param {(signal: AbortSignal) => Promise<object>} start
 * @param {(stack: object) => void} whenUp
 */
export async function untilStopped(start, whenUp) {
  const signal = stopSignal()
  try {
    const stack = await start(signal)
    if (!signal.aborted) whenUp(stack)
    await stay(stack, signal)
  } catch (error) {
    if (!signal.aborted || !(error instanceof Trouble)) {
      explain(error)
      process.exitCode = 1
    }
  }
  process.exit()
}
