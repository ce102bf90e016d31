/** What a database server can be for. Each has a folder under .data and ports of its own, so none meets another. */
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

/** The project's folder. */
export const ROOT = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '')

/** Everything that the project makes for itself while it runs; deleting it is a fresh start. */
export const KEPT = join(ROOT, '.data')
export const LOGS = join(KEPT, 'logs')

/**
 * `database`: the first port to try, then every second one; `web`, `mail`, `inbox` and `files` likewise, one by one.
 * `flush` 1 survives a power cut, 2 a killed process. `memory` is what the server may keep of its pages: 1 GiB holds
 * 100,000 homes.
 */
export const PURPOSES = {
  demo: {
    folder: 'db',
    database: 13307,
    web: 3000,
    mail: 14307,
    inbox: 15307,
    files: 16307,
    flush: 1,
    memory: '512M',
  },
  test: { folder: 'test-db', database: 13337, flush: 2, memory: '256M' },
  e2e: {
    folder: 'e2e-db',
    database: 13367,
    web: 3300,
    mail: 14367,
    inbox: 15367,
    files: 16367,
    flush: 2,
    memory: '256M',
  },
  shots: {
    folder: 'shots-db',
    database: 13397,
    web: 3600,
    mail: 14397,
    inbox: 15397,
    files: 16397,
    flush: 2,
    memory: '256M',
  },
  bench: {
    folder: 'bench-db',
    database: 13427,
    web: 3900,
    mail: 14427,
    inbox: 15427,
    files: 16427,
    flush: 1,
    memory: '1G',
  },
}

/** Where a purpose keeps its database. */
export const folderOf = (purpose) => join(KEPT, PURPOSES[purpose].folder)
