/** What an import cannot do without: reading every row, and inserting every row it leaves behind. Nothing else. */
import { once } from 'node:events'
import { createReadStream } from 'node:fs'
import { parse } from 'csv-parse'
import { createConnection } from 'mysql2/promise'

const TABLES = ['homes', 'home_facts', 'inspections', 'defects', 'home_register', 'assessments'] as const
const ROWS_A_STATEMENT = 1_000
/** Columns that the database makes itself. */
const GENERATED = new Set(['built_sort'])

/** Reads a CSV file with the library alone [ms]. */
export async function bareParse(path: string): Promise<number> {
  const began = performance.now()
  const rows = createReadStream(path).pipe(parse({ bom: true }))
  rows.resume()
  await once(rows, 'end')
  return performance.now() - began
}

/** Inserts what an organisation has into empty copies of its tables, in multi-row statements of the bare driver [ms]. */
export async function bareInsert(migrateUrl: string, organisationId: string): Promise<number> {
  const db = await createConnection({
    uri: migrateUrl,
    timezone: 'Z',
    dateStrings: ['DATE'],
    decimalNumbers: true,
    jsonStrings: true,
  })
  let taken = 0
  try {
    for (const table of TABLES) {
      await db.query('drop table if exists bare_copy')
      await db.query(`create table bare_copy like \`${table}\``)
      const [rows] = (await db.query(`select * from \`${table}\` where organisation_id = ?`, [
        organisationId,
      ])) as unknown as [Record<string, unknown>[], unknown]
      const columns = Object.keys(rows[0] ?? {}).filter((column) => !GENERATED.has(column))
      const parts = Array.from({ length: Math.ceil(rows.length / ROWS_A_STATEMENT) }, (_, part) =>
        rows
          .slice(part * ROWS_A_STATEMENT, (part + 1) * ROWS_A_STATEMENT)
          .map((row) => columns.map((column) => row[column])),
      )
      const began = performance.now()
      await db.beginTransaction()
      for (const part of parts)
        await db.query(`insert into bare_copy (\`${columns.join('`,`')}\`) values ?`, [part])
      await db.commit()
      taken += performance.now() - began
    }
    await db.query('drop table if exists bare_copy')
    return taken
  } finally {
    await db.end()
  }
}
