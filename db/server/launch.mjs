/** A MariaDB server of the project's own: found where it runs, made where there is none. */
import { spawn } from 'node:child_process'
import { createHash } from 'node:crypto'
import {
  chmodSync,
  closeSync,
  existsSync,
  mkdtempSync,
  openSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  symlinkSync,
} from 'node:fs'
import { userInfo } from 'node:os'
import { basename, dirname, join } from 'node:path'
import { serverAccount, temporaryFolder } from './account.mjs'
import { freePort } from './free-port.mjs'
import { programPath } from './install-if-missing.mjs'
import { beganAt, pause, stillRuns, nameOf, wordsOf } from './processes.mjs'
import { LOGS } from './purposes.mjs'
import { answers } from './run-sql.mjs'
import { Trouble } from './trouble.mjs'

const PATIENCE = 60_000
const pidFile = (dataDir) => join(dataDir, 'fuseward.pid')

const logOf = (dataDir) => join(LOGS, `mariadb-${basename(dataDir)}.log`)

/** A short name of a folder, without any character that a path or a script could trip over. */
const markOf = (dataDir) => createHash('sha256').update(dataDir).digest('hex').slice(0, 12)

const wordAfter = (words, name) => words.find((word) => word.startsWith(`--${name}=`))?.slice(name.length + 3)

/** The project's server that runs on a folder now, or null. A number left behind by a killed server names nothing. */
export async function findServer(dataDir) {
  if (!existsSync(pidFile(dataDir))) return null
  const pid = Number(readFileSync(pidFile(dataDir), 'utf8'))
  const words = pid > 0 && beganAt(pid) ? wordsOf(pid) : []
  if (wordAfter(words, 'datadir') !== dataDir) return null
  const server = { pid, port: Number(wordAfter(words, 'port')), socket: wordAfter(words, 'socket') }
  await ready(server, dataDir)
  return server
}

async function ready({ pid, socket }, dataDir) {
  const name = nameOf(pid)
  for (const until = Date.now() + PATIENCE; Date.now() < until && stillRuns(name); await pause(40))
    if (existsSync(socket) && (await answers(socket))) return
  throw new Trouble('The database server did not come up.', {
    log: logOf(dataDir),
    advice: `If the log names a damaged file, remove ${dataDir} and start again: it holds only what the project made.`,
  })
}

/** Runs a program to its end, with all it says in the log. */
function runLogged(program, words, log) {
  const out = openSync(log, 'a')
  const child = spawn(program, words, { stdio: ['ignore', out, out] })
  closeSync(out)
  return new Promise((resolve, reject) => {
    child.once('error', reject)
    child.once('close', (code) => resolve(code))
  })
}

/** Makes an empty database folder, whole or not at all. Its owner is whoever starts it, known by the socket. */
export async function makeFolder(dataDir) {
  const account = serverAccount(dataDir)
  const half = join(dirname(dataDir), `half-made-${markOf(dataDir)}`)
  rmSync(half, { recursive: true, force: true })
  // MariaDB's script takes a path apart at its spaces, so it is shown one without any that leads to the same place
  const plain = mkdtempSync(join(temporaryFolder(account, ''), 'fuseward-'))
  chmodSync(plain, 0o755)
  symlinkSync(dirname(half), join(plain, 'data'))
  const code = await runLogged(
    programPath('mariadb-install-db'),
    [
      '--no-defaults',
      `--datadir=${join(plain, 'data', basename(half))}`,
      '--auth-root-authentication-method=socket',
      `--auth-root-socket-user=${userInfo().username}`,
      '--skip-test-db',
      ...(account.user ? [`--user=${account.user}`] : []),
    ],
    logOf(dataDir),
  )
  rmSync(plain, { recursive: true })
  if (code !== 0) throw new Trouble('The database folder could not be made.', { log: logOf(dataDir) })
  renameSync(half, dataDir)
}

/** Starts a server on a folder, on the first free port from a number on. */
export async function launch(dataDir, { database: from, flush, memory }) {
  const account = serverAccount(dataDir)
  const name = `fuseward-${markOf(dataDir)}.sock`
  const temporary = temporaryFolder(account, name)
  const socket = join(temporary, name)
  rmSync(socket, { force: true })
  rmSync(pidFile(dataDir), { force: true })
  for (let first = from; ;) {
    const port = await freePort(first, { step: 2 })
    const said = existsSync(logOf(dataDir)) ? statSync(logOf(dataDir)).size : 0
    const out = openSync(logOf(dataDir), 'a')
    const child = spawn(
      programPath('mariadbd'),
      [
        '--no-defaults',
        ...(account.user ? [`--user=${account.user}`] : []),
        `--datadir=${dataDir}`,
        `--socket=${socket}`,
        `--pid-file=${pidFile(dataDir)}`,
        `--tmpdir=${temporary}`,
        `--port=${port}`,
        '--bind-address=127.0.0.1',
        '--skip-name-resolve',
        '--skip-log-bin',
        '--character-set-server=utf8mb4',
        '--collation-server=utf8mb4_uca1400_ai_ci',
        '--default-time-zone=+00:00',
        '--max-allowed-packet=64M',
        '--innodb-snapshot-isolation=ON',
        `--innodb-flush-log-at-trx-commit=${flush}`,
        `--innodb-buffer-pool-size=${memory}`,
        '--innodb-log-file-size=256M',
      ],
      { cwd: '/', stdio: ['ignore', out, out], detached: true }, // its own session, so that Ctrl-C reaches only who stops it in order
    )
    closeSync(out)
    child.unref()
    const failed = new Promise((resolve) => child.once('error', resolve))
    try {
      const error = await Promise.race([ready({ pid: child.pid, socket }, dataDir), failed])
      if (error) throw error
      return { pid: child.pid, port, socket }
    } catch (error) {
      const words = readFileSync(logOf(dataDir), 'utf8').slice(said)
      if (!/port: \d+ \?|Address already in use/.test(words)) throw error
      first = port + 2 // another program took the port between the look and the start
    }
  }
}
