/** What an import cannot do without: reading every row, and inserting every row it leaves behind. Nothing else. */
import { once } from 'node:events'
import { createReadStream } from 'node:fs'
import { parse } from 'csv-parse'
import { openPool } from '@/db/knex'

const TABLES = ['homes', 'home_facts', 'inspections', 'defects', 'home_register', 'assessments'] as const
const ROWS_A_STATEMENT = 1_000

/** Reads a CSV file with the library alone [ms]. */
export async function bareParse(path: string): Promise<number> {
  const began = performance.now()
  const rows = createReadStream(path).pipe(parse({ bom: true }))
  rows.resume()
  await once(rows, 'end')
  return performance.now() - began
}

type Raw = { query: (sql: string, values: unknown[], done: (error: Error | null) => void) => void }

/** Inserts what an organisation has into empty copies of its tables, in multi-row statements of the driver's own [ms]. */
export async function bareInsert(migrateUrl: string, organisationId: string): Promise<number> {
  const db = openPool(migrateUrl, 1)
  let taken = 0
  try {
    for (const table of TABLES) {
      await db.raw('drop table if exists bare_copy')
      await db.raw('create table bare_copy like ??', [table])
      const rows = (await db(table).where('organisation_id', organisationId).select('*')) as Record<
        string,
        unknown
      >[]
      const columns = Object.keys(rows[0] ?? {})
      const connection = (await db.client.acquireConnection()) as Raw
      const send = (sql: string, values: unknown[]) =>
        new Promise<void>((resolve, reject) =>
          connection.query(sql, values, (error) => (error ? reject(error) : resolve())),
        )
      const parts = Array.from({ length: Math.ceil(rows.length / ROWS_A_STATEMENT) }, (_, part) =>
        rows
          .slice(part * ROWS_A_STATEMENT, (part + 1) * ROWS_A_STATEMENT)
          .map((row) => columns.map((column) => row[column])),
      )
      const began = performance.now()
      await send('begin', [])
      for (const part of parts)
        await send(`insert into bare_copy (\`${columns.join('`,`')}\`) values ?`, [part])
      await send('commit', [])
      taken += performance.now() - began
      await db.client.releaseConnection(connection)
    }
    await db.raw('drop table if exists bare_copy')
    return taken
  } finally {
    await db.destroy()
  }
}
