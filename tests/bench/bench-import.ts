import { join } from 'node:path'
import { reading } from '@/db/connection'
import * as organisations from '@/db/repositories/organisations'
import { anOrganisation } from '@/tests/builders/an-organisation'
import { bareInsert, bareParse } from './bare-import'
import { type Figure } from './figures'
import { writeStockFile } from './stock-file'

type Run = (file: string, words: string[], options: { maxBuffer: number }) => Promise<{ stdout: string }>

/** A whole stock list taken in by a process of its own, beside bare parse plus bare multi-row insert of what it left. */
export async function benchImport(folder: string, rows: number, run: Run): Promise<Figure[]> {
  const path = join(folder, 'stock.csv')
  await writeStockFile(path, rows)
  const { manager } = await anOrganisation({ name: 'Bench Import' })
  const { slug } = await organisations.get(reading(manager))
  const words = ['--max-semi-space-size=16', '--import', 'tsx', 'tests/bench/import-once.ts', path, slug]
  const { stdout } = await run(process.execPath, words, { maxBuffer: 1_000_000 })
  const taken = JSON.parse(stdout) as { milliseconds: number; peakMiB: number; added: number }
  if (taken.added !== rows) throw new Error(`the import added ${taken.added} homes of ${rows}`)
  const bare =
    (await bareParse(path)) +
    (await bareInsert(process.env.DATABASE_URL_MIGRATE ?? '', manager.organisationId))
  return [
    {
      what: 'import of the stock list',
      value: taken.milliseconds / 1000,
      unit: 's',
      bare: bare / 1000,
      most: 4,
    },
    { what: 'imported a second', value: (rows / taken.milliseconds) * 1000, unit: 'rows' },
    { what: 'peak memory of the import', value: taken.peakMiB, unit: 'MiB', most: 400, mostIs: 'value' },
  ]
}
