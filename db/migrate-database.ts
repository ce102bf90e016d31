/** Brings one database to the newest schema, and gives its users their rights. */
import { openPool } from './knex'
import { type Account, grantRights } from './grants'
import { migrationSource } from './migrations/source'

export type DatabaseAddresses = { migrate: string; app: string; read?: string }

/** Who an address signs in as. The database is left out: before the first grant it may not be entered. */
async function accountOf(address: string): Promise<Account> {
  const server = new URL(address)
  server.pathname = '/'
  const pool = openPool(server.href, 1)
  try {
    const [rows] = (await pool.raw('select current_user() as account')) as [{ account: Account }[], unknown]
    return rows[0]?.account ?? ''
  } finally {
    await pool.destroy()
  }
}

/**
 * Runs the migrations that have not run, then grants. Repeatable.
 * @returns the names of the migrations that ran
 */
export async function migrateDatabase(addresses: DatabaseAddresses): Promise<string[]> {
  const pool = openPool(addresses.migrate, 2)
  try {
    const [, ran] = (await pool.migrate.latest({ migrationSource })) as [number, string[]]
    const read = addresses.read && (await accountOf(addresses.read))
    await grantRights(pool, { app: await accountOf(addresses.app), ...(read && { read }) })
    return ran
  } finally {
    await pool.destroy()
  }
}
