/** Which account of this machine a database server runs under. */
import { spawnSync } from 'node:child_process'
import { existsSync, statSync } from 'node:fs'
import { dirname } from 'node:path'
import { tmpdir } from 'node:os'

const idOf = (flag) => Number(spawnSync('id', [flag, 'mysql'], { encoding: 'utf8' }).stdout?.trim() || NaN)

const can = (account, test, folder) =>
  spawnSync('test', [test, folder], { uid: account.uid, gid: account.gid }).status === 0

const foldersAbove = (folder) =>
  dirname(folder) === folder ? [] : [...foldersAbove(dirname(folder)), dirname(folder)]

/**
 * The account to run a server under: the person's own, or, for root, `mysql` where it can reach the folder, else root.
 * A folder that is there already keeps the account that owns it.
 * @returns {{ user: string | null, uid?: number, gid?: number }} user null: whoever starts it
 */
export function serverAccount(dataDir) {
  if (process.getuid?.() !== 0) return { user: null }
  const mysql = { user: 'mysql', uid: idOf('-u'), gid: idOf('-g') }
  const root = { user: 'root', uid: 0, gid: 0 }
  if (Number.isNaN(mysql.uid)) return root
  if (existsSync(dataDir) && statSync(dataDir).uid === 0) return root
  return foldersAbove(dataDir).every((folder) => !existsSync(folder) || can(mysql, '-x', folder))
    ? mysql
    : root
}

/** The longest path that a socket can have, without its closing zero [bytes]. */
const SOCKET_PATH = 107

/**
 * A folder for the socket and for sorting on disk: the system's temporary one, where the path fits, is writable
 * and has no spaces.
 */
export function temporaryFolder(account, name) {
  const fits = (folder) => !/\s/.test(folder) && Buffer.byteLength(`${folder}/${name}`) <= SOCKET_PATH
  const writable = (folder) => account.user === null || can(account, '-w', folder)
  return (
    [tmpdir(), '/tmp', '/var/tmp'].find((folder) => existsSync(folder) && fits(folder) && writable(folder)) ??
    '/tmp'
  )
}
