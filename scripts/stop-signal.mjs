/** Being told to stop: by Ctrl-C, by a signal, or because the npm that started this has gone. */
import { nameOf, parentOf, stillRuns, wordsOf } from '../db/server/processes.mjs'

/** npm runs a script through a shell, which may stay in between. */
function npmAbove() {
  const isShell = wordsOf(process.ppid)[1] === '-c'
  return [process.ppid, isShell && parentOf(process.ppid)].filter(Boolean).map(nameOf)
}

/** npm does not always pass a signal on to what it started; a launcher whose npm has gone is meant to go too. */
function whenNpmGoes(tell) {
  if (!process.env.npm_lifecycle_event) return
  const above = npmAbove()
  const look = () => !above.every(stillRuns) && tell('npm, which started this, has gone')
  setInterval(look, 1_000).unref()
}

/** A signal that aborts once, with a line that says why. */
export function stopSignal() {
  const stopper = new AbortController()
  const tell = (why) => {
    if (stopper.signal.aborted) return
    process.stdout.write(`\nStopping: ${why}.\n`)
    stopper.abort()
  }
  process.on('SIGINT', () => tell('Ctrl-C'))
  for (const name of ['SIGTERM', 'SIGHUP']) process.on(name, () => tell(name))
  whenNpmGoes(tell)
  return stopper.signal
}

/** Resolves when the signal aborts. */
export const aborted = (signal) =>
  new Promise((resolve) =>
    signal.aborted ? resolve(null) : signal.addEventListener('abort', () => resolve(null)),
  )
