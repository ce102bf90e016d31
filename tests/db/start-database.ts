/** Before the database tests: the tests' own MariaDB. Each run has databases of its own, so two runs never meet. */
import { type TestProject } from 'vitest/node'
import { installIfMissing } from '@/db/server/install-if-missing.mjs'
import { startServer } from '@/db/server/start-server.mjs'
import { openPool } from '@/db/knex'

export type TestDatabases = { migrate: string; app: string; read: string; prefix: string }

declare module 'vitest' {
  interface ProvidedContext {
    databases: TestDatabases
  }
}

const isAlive = (pid: number) => {
  try {
    return process.kill(pid, 0)
  } catch {
    return false
  }
}

/** Removes this run's databases and those that a killed run left behind. */
async function tidy(migrate: string): Promise<void> {
  const pool = openPool(migrate, 1)
  try {
    await pool.raw('set foreign_key_checks = 0')
    const [rows] = (await pool.raw(String.raw`show databases like 'fuseward\_t%'`)) as [
      Record<string, string>[],
      unknown,
    ]
    for (const name of rows.flatMap((row) => Object.values(row))) {
      const run = Number(/^fuseward_t(\d+)_/.exec(name)?.[1])
      if (run === process.pid || !isAlive(run)) await pool.raw('drop database if exists ??', [name])
    }
  } finally {
    await pool.destroy()
  }
}

export default async function startDatabase(project: TestProject): Promise<() => Promise<void>> {
  installIfMissing()
  const server = await startServer({ purpose: 'test' })
  await tidy(server.urls.migrate)
  project.provide('databases', { ...server.urls, prefix: `fuseward_t${process.pid}_` })
  return async () => {
    await tidy(server.urls.migrate)
    await server.stop()
  }
}
