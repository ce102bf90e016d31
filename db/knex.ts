/** The connection pools. Everything else asks for a Scope from connection.ts. */
import knex, { type Knex } from 'knex'
import { env } from '@/lib/platform/env'

const SQL_MODE =
  'STRICT_TRANS_TABLES,ONLY_FULL_GROUP_BY,NO_ZERO_DATE,NO_ZERO_IN_DATE,ERROR_FOR_DIVISION_BY_ZERO'

type SessionConnection = { query: (sql: string, done: (error: Error | null) => void) => void }

/** A pool on a MariaDB address: strict, UTC, snapshot isolation, DATE as text, numbers as numbers. */
export function openPool(url: string, size = env().DATABASE_POOL): Knex {
  const at = new URL(url)
  return knex({
    client: 'mysql2',
    connection: {
      host: at.hostname,
      port: Number(at.port || 3306),
      user: decodeURIComponent(at.username),
      password: decodeURIComponent(at.password),
      database: at.pathname.slice(1),
      charset: 'utf8mb4',
      timezone: 'Z',
      decimalNumbers: true,
      supportBigNumbers: true,
      jsonStrings: true,
      dateStrings: ['DATE'] as unknown as boolean, // the driver takes a list; Knex's type knows only a flag
    } as Knex.MySql2ConnectionConfig,
    pool: {
      min: 0,
      max: size,
      afterCreate: (
        connection: SessionConnection,
        done: (error: Error | null, connection: SessionConnection) => void,
      ) =>
        connection.query(
          `set session sql_mode='${SQL_MODE}', innodb_snapshot_isolation=on, time_zone='+00:00', foreign_key_checks=1`,
          (error) => done(error, connection),
        ),
    },
  })
}

const pools = globalThis as unknown as { fusewardPool?: Knex }

/** The application's pool, one a process (kept across hot reloads). */
export const pool = (): Knex => (pools.fusewardPool ??= openPool(env().DATABASE_URL))

/** Closes the application's pool: for commands and tests that end. */
export async function closePool(): Promise<void> {
  await pools.fusewardPool?.destroy()
  delete pools.fusewardPool
}
