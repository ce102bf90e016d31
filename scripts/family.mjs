/** The processes that one launcher starts: noted in a file, ended in order, and none left behind. */
import { spawn } from 'node:child_process'
import { closeSync, existsSync, mkdirSync, openSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { withLock } from '../db/server/lock.mjs'
import { endProcess, nameOf, stillRuns } from '../db/server/processes.mjs'
import { KEPT, LOGS, ROOT } from '../db/server/purposes.mjs'
import { Trouble } from '../db/server/trouble.mjs'

/** No step takes longer than this, so one that does is stuck [milliseconds]. */
const LONGEST_STEP = 15 * 60_000

const FOLDER = join(KEPT, 'run')
const noteOf = (purpose) => join(FOLDER, `${purpose}.json`)
const pidOf = (name) => Number(name.split('-')[0])

function readNote(purpose) {
  if (!existsSync(noteOf(purpose))) return null
  try {
    return JSON.parse(readFileSync(noteOf(purpose), 'utf8'))
  } catch {
    return null // half written by a launcher that was killed: it names nobody
  }
}

/** What runs for a purpose now, or null. */
export function running(purpose) {
  const note = readNote(purpose)
  return note && stillRuns(note.launcher) ? note : null
}

/** Ends a child and what it started in turn: a child leads a group of its own. */
async function endFamily(pid) {
  const how = await endProcess(pid)
  try {
    process.kill(-pid, 'SIGKILL')
  } catch (error) {
    if (error.code !== 'ESRCH') throw error // nobody of the group is left: good
  }
  return how
}

/**
 * Takes a purpose for this launcher, and ends what a killed one left running.
 * @throws Trouble where another launcher has it
 */
export function claim(purpose) {
  mkdirSync(FOLDER, { recursive: true })
  mkdirSync(LOGS, { recursive: true })
  return withLock(join(FOLDER, `${purpose}.lock`), async () => {
    const other = running(purpose)
    if (other)
      throw new Trouble(
        `Fuseward (${purpose}) is running already${other.url ? ` at ${other.url}` : ''}, as process ${pidOf(other.launcher)}.`,
        { advice: 'Stop that one first (Ctrl-C where it runs), then run this again.' },
      )
    const orphans = (readNote(purpose)?.children ?? []).filter(({ process: name }) => stillRuns(name))
    await Promise.all(orphans.map((orphan) => endFamily(pidOf(orphan.process))))
    return new Family(purpose, orphans.length)
  })
}

class Family {
  #children = []
  stopping = false
  #died
  url = null
  ports = null

  constructor(purpose, orphans) {
    this.purpose = purpose
    /** how many processes an earlier, killed launcher had left behind */
    this.orphans = orphans
    /** resolves with a Trouble when a child ends that was not told to */
    this.death = new Promise((resolve) => (this.#died = resolve))
    this.#note()
  }

  #note() {
    const children = this.#children.map(({ name, process }) => ({ name, process }))
    writeFileSync(
      noteOf(this.purpose),
      JSON.stringify({ launcher: nameOf(process.pid), url: this.url, ports: this.ports, children }),
    )
  }

  logOf(name) {
    return join(LOGS, `${this.purpose}-${name}.log`)
  }

  /** Says where it can be reached, now that it is up. */
  at(url, ports) {
    this.url = url
    this.ports = ports
    this.#note()
  }

  #spawn(name, words, env) {
    if (this.stopping) throw new Trouble('Stopping.')
    const log = this.logOf(name)
    const out = openSync(log, 'w')
    const child = spawn(words[0], words.slice(1), {
      cwd: ROOT,
      env,
      stdio: ['ignore', out, out],
      detached: true,
    })
    closeSync(out)
    const ended = new Promise((resolve) => {
      child.once('error', (error) => resolve(error.message))
      child.once('close', (code, signal) => resolve(signal ?? code))
    })
    const entry = { name, log, pid: child.pid, process: nameOf(child.pid), ended }
    this.#children.push(entry)
    this.#note()
    return entry
  }

  /** Starts a process that is to stay up. */
  start(name, words, env = process.env) {
    const child = this.#spawn(name, words, env)
    child.ended.then((how) => {
      if (!this.stopping)
        this.#died(new Trouble(`The ${name} process ended by itself (${how}).`, { log: child.log }))
    })
    return child
  }

  /**
   * Runs a process to its end, or to a limit of patience.
   * @returns {Promise<number | string>} its exit code, or the signal that ended it
   */
  async run(name, words, env = process.env, limit = LONGEST_STEP) {
    const child = this.#spawn(name, words, env)
    const timer = setTimeout(() => endFamily(child.pid), limit)
    const how = await child.ended
    clearTimeout(timer)
    this.#children = this.#children.filter((one) => one !== child)
    this.#note()
    return how
  }

  /**
   * Runs a process that must succeed.
   * @throws Trouble with its log where it does not
   */
  async must(name, words, env, failure) {
    const how = await this.run(name, words, env)
    if (how !== 0) throw new Trouble(failure.message, { advice: failure.advice, log: this.logOf(name) })
  }

  /** Ends every child, the last started first and those named last after all others. */
  async stop(...last) {
    this.stopping = true
    const [after, before] = [true, false].map((late) =>
      this.#children.filter(({ name }) => last.includes(name) === late),
    )
    for (const group of [before, after]) await Promise.all(group.map(({ pid }) => endFamily(pid)))
    rmSync(noteOf(this.purpose), { force: true })
  }
}
