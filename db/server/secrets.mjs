/** Passwords and keys of this machine's own installation: made once, kept in .data, readable by their owner alone. */
import { randomBytes } from 'node:crypto'
import { linkSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { KEPT } from './purposes.mjs'

const fresh = () => randomBytes(24).toString('base64url')

/** The secrets, made on first use. */
export function secrets() {
  const file = join(KEPT, 'secrets.json')
  const mine = `${file}.${process.pid}`
  mkdirSync(KEPT, { recursive: true })
  try {
    return JSON.parse(readFileSync(file, 'utf8'))
  } catch (error) {
    if (error.code !== 'ENOENT') throw error
  }
  const made = {
    database: { app: fresh(), migrate: fresh(), read: fresh() },
    session: randomBytes(48).toString('base64url'),
  }
  writeFileSync(mine, `${JSON.stringify(made, null, 2)}\n`, { mode: 0o600 })
  try {
    linkSync(mine, file)
    return made
  } catch (error) {
    if (error.code !== 'EEXIST') throw error
    return JSON.parse(readFileSync(file, 'utf8')) // another process made them at the same moment
  } finally {
    rmSync(mine, { force: true })
  }
}
