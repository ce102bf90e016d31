/** Which statements some work sends to the database, to run them again bare. */
import { pool } from '@/db/knex'

export type Statement = { readonly sql: string; readonly bindings: readonly unknown[] }

/** Listens to the pool while the work runs. */
export async function statementsOf(work: () => Promise<unknown>): Promise<Statement[]> {
  const heard: Statement[] = []
  const listen = ({ sql, bindings }: { sql: string; bindings?: readonly unknown[] }) => {
    heard.push({ sql, bindings: bindings ?? [] })
  }
  pool().on('query', listen)
  try {
    await work()
  } finally {
    pool().removeListener('query', listen)
  }
  return heard
}
