/** Processes by their id: who is alive, what it is, and an end to it. Never by name. */
import { spawnSync } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { Trouble } from './trouble.mjs'

export const pause = (milliseconds) => new Promise((resolve) => setTimeout(resolve, milliseconds))

const proc = (pid, file) => {
  try {
    return readFileSync(`/proc/${pid}/${file}`, 'utf8')
  } catch {
    return null
  }
}

const ps = (pid, column) =>
  spawnSync('ps', ['-o', `${column}=`, '-p', String(pid)], { encoding: 'utf8' }).stdout?.trim() || null

const statOf = (pid) => proc(pid, 'stat')?.split(') ').at(-1)?.split(' ')

/** The process that started another, or null where that cannot be told. */
export const parentOf = (pid) => Number(statOf(pid)?.[1]) || null

/**
 * When a process began, as a text that no later process with the same number shares; null where there is none.
 * A process that has ended and waits for its parent to notice counts as gone.
 */
export function beganAt(pid) {
  if (process.platform !== 'linux') return ps(pid, 'lstart')?.replace(/\W+/g, '') ?? null
  const fields = statOf(pid)
  return fields && fields[0] !== 'Z' ? (fields[19] ?? null) : null
}

/** The words a process was started with, or none. */
export function wordsOf(pid) {
  if (process.platform !== 'linux') return ps(pid, 'command')?.split(' ') ?? []
  return proc(pid, 'cmdline')?.split('\0').filter(Boolean) ?? []
}

/** This process or another, named so that it cannot be taken for a later one with the same number. */
export const nameOf = (pid) => `${pid}-${beganAt(pid)}`

/** Whether a process named by nameOf still runs. */
export function stillRuns(name) {
  const [pid, began] = name.split('-')
  return began !== undefined && beganAt(Number(pid)) === began
}

const signal = (pid, kind) => {
  try {
    process.kill(pid, kind)
  } catch (error) {
    if (error.code !== 'ESRCH') throw error
  }
}

/**
 * Asks a process to end, and makes it where it has not by then.
 * @returns {Promise<'ended' | 'killed'>}
 */
export async function endProcess(pid, patience = 20_000) {
  const name = nameOf(pid)
  signal(pid, 'SIGTERM')
  for (const until = Date.now() + patience; Date.now() < until; await pause(25))
    if (!stillRuns(name)) return 'ended'
  signal(pid, 'SIGKILL')
  for (const until = Date.now() + 5_000; Date.now() < until; await pause(25))
    if (!stillRuns(name)) return 'killed'
  throw new Trouble(`Process ${pid} would not end.`, { advice: `End it by hand: kill -9 ${pid}` })
}
