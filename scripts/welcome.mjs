/** What a person who has just started the demo needs: where it is, and who they can be in it. */
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { KEPT } from '../db/server/purposes.mjs'

/** Where the seeder writes who can sign in. */
export const SIGN_INS = join(KEPT, 'demo-sign-ins.json')

/** The sign-ins of the demo, as its seeder wrote them: who, where, in which role, and the password. */
export function signIns() {
  return existsSync(SIGN_INS) ? JSON.parse(readFileSync(SIGN_INS, 'utf8')) : []
}

function table(rows) {
  const widths = rows[0].map((_, column) => Math.max(...rows.map((row) => row[column].length)))
  return rows.map(
    (row) =>
      `    ${row
        .map((cell, column) => cell.padEnd(widths[column]))
        .join('  ')
        .trimEnd()}`,
  )
}

/** Prints the addresses and the sign-ins. */
export function welcome({ url, inbox }, since) {
  const people = signIns().map(({ organisation, name, role, email, password }) => [
    organisation,
    role,
    name,
    email,
    password,
  ])
  const lines = [
    '',
    `Fuseward is at  ${url}   (ready after ${((Date.now() - since) / 1000).toFixed(1)} s)`,
    `Its letters at  ${inbox}   (invitations and new passwords end here, not with anybody)`,
    ...(people.length > 0
      ? ['', 'Sign in as', ...table([['Organisation', 'Role', 'Name', 'E-mail', 'Password'], ...people])]
      : []),
    '',
    'Ctrl-C stops everything. Logs are in .data/logs.',
    '',
  ]
  process.stdout.write(`${lines.join('\n')}\n`)
}
