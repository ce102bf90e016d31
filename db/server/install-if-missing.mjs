/** Programs that the project runs and Debian ships. */
import { spawnSync } from 'node:child_process'
import { existsSync, mkdirSync, openSync, closeSync } from 'node:fs'
import { delimiter, join } from 'node:path'
import { LOGS } from './purposes.mjs'
import { Trouble } from './trouble.mjs'

const PLACES = [
  ...(process.env.PATH ?? '').split(delimiter),
  '/usr/local/sbin',
  '/usr/sbin',
  '/sbin',
  '/usr/local/bin',
  '/usr/bin',
]

/** The full path of a program, or null where this machine has none. */
export const findProgram = (name) =>
  PLACES.map((place) => join(place, name)).find((path) => existsSync(path)) ?? null

/**
 * The full path of a program.
 * @throws Trouble where this machine has none
 */
export function programPath(name) {
  const path = findProgram(name)
  if (!path)
    throw new Trouble(`The program ${name} is not on this machine.`, {
      advice: 'Run npm start, which installs it.',
    })
  return path
}

const INSTALL = ['apt-get', 'install', '-y', '--no-install-recommends']

/**
 * Installs a Debian package where its programs are missing.
 * @returns {'present' | 'installed'}
 * @throws Trouble without root, with the one command to run, or where apt fails
 */
export function installIfMissing({
  debianPackage = 'mariadb-server',
  programs = ['mariadbd', 'mariadb', 'mariadb-install-db'],
} = {}) {
  if (programs.every(findProgram)) return 'present'
  const byHand = `sudo ${INSTALL.join(' ')} ${debianPackage}`
  const name = programs[0]
  if (!findProgram('apt-get'))
    throw new Trouble(`${name} is not installed, and this is not Debian.`, {
      advice: `Install ${debianPackage} as your system does, then run this again.`,
    })
  if (process.getuid?.() !== 0)
    throw new Trouble(`${name} is not installed.`, {
      advice: `Run this once, then start again:\n  ${byHand}`,
    })
  mkdirSync(LOGS, { recursive: true })
  const log = join(LOGS, `install-${debianPackage}.log`)
  const out = openSync(log, 'a')
  const run = (words) =>
    spawnSync(words[0], ['-o', 'DPkg::Lock::Timeout=300', '-q', ...words.slice(1)], {
      stdio: ['ignore', out, out],
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive', NEEDRESTART_SUSPEND: '1' },
    }).status === 0
  const install = () => run([...INSTALL, debianPackage])
  // a fresh machine has no package lists, and an old one has lists that name files that are gone
  const done = install() || (run(['apt-get', 'update']) && install())
  closeSync(out)
  if (!done || !programs.every(findProgram))
    throw new Trouble(`Debian's package ${debianPackage} could not be installed.`, {
      advice: `See why, then run this again:\n  ${byHand}`,
      log,
    })
  return 'installed'
}
