/** One readable line for each step, with its seconds; the details go to a log file. */
import { relative } from 'node:path'
import { ROOT } from '../db/server/purposes.mjs'
import { lastLines, Trouble } from '../db/server/trouble.mjs'

const seconds = (since) => `${((Date.now() - since) / 1000).toFixed(1)} s`
const line = (mark, name, said, since) =>
  `${mark} ${name.padEnd(12)} ${said.padEnd(44)} ${seconds(since).padStart(8)}`
const live = process.stdout.isTTY && !process.env.CI

/**
 * Runs a step and prints its line. The work gives back a few words on what it found or did.
 * @template T
 * @param {() => Promise<T> | T} work
 * @returns {Promise<T>}
 */
export async function step(name, work) {
  const since = Date.now()
  if (live) process.stdout.write(`  ${name.padEnd(12)} …`)
  const end = live ? '\r\x1b[K' : ''
  try {
    const result = await work()
    const said = typeof result === 'string' ? result : (result?.said ?? 'done')
    process.stdout.write(`${end}${line('✓', name, said, since)}\n`)
    return result
  } catch (error) {
    process.stdout.write(`${end}${line('✗', name, 'failed', since)}\n`)
    throw error
  }
}

/** The same, said to nobody: for a stack that is part of something larger. */
export const quietly = async (_name, work) => work()

/** Says what failed, the end of its log, and what to do. */
export function explain(error) {
  const { message, advice, log, stack } = error
  const told = error instanceof Trouble
  process.stderr.write(`\n${told ? message : (stack ?? message)}\n`)
  for (const words of lastLines(log)) process.stderr.write(`  | ${words}\n`)
  if (log) process.stderr.write(`The whole of it: ${relative(process.cwd(), log) || ROOT}\n`)
  if (advice) process.stderr.write(`${advice}\n`)
}
