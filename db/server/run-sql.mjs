/** SQL as the server's owner, through its socket. Statements go by standard input, so no process list shows them. */
import { spawn } from 'node:child_process'
import { userInfo } from 'node:os'
import { programPath } from './install-if-missing.mjs'
import { Trouble } from './trouble.mjs'

/**
 * Runs statements and gives back what they print, tab-separated without headings.
 * @throws Trouble where the server does not answer or refuses
 */
export function runSql(socket, sql) {
  const words = [
    '--no-defaults',
    '--batch',
    '--skip-column-names',
    '--connect-timeout=5',
    `--socket=${socket}`,
    `--user=${userInfo().username}`,
  ]
  const client = spawn(programPath('mariadb'), words, { stdio: ['pipe', 'pipe', 'pipe'] })
  const said = { out: '', error: '' }
  client.stdout.on('data', (piece) => (said.out += piece))
  client.stderr.on('data', (piece) => (said.error += piece))
  client.stdin.on('error', () => {}) // the client says by its exit code that it could not connect
  client.stdin.end(sql)
  return new Promise((resolve, reject) => {
    client.once('error', reject)
    client.once('close', (code) =>
      code === 0 ? resolve(said.out) : reject(new Trouble(`The database refused: ${said.error.trim()}`)),
    )
  })
}

/** Whether a server answers on a socket. */
export const answers = (socket) =>
  runSql(socket, 'select 1').then(
    () => true,
    () => false,
  )
