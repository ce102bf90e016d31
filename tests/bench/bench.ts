/**
 * `npm run bench -- --homes N [--parts rescore,pages,import]`: the register at size, each figure beside the bare work that it cannot do without,
 * measured in the same run. Prints a table, and keeps it in .data/bench.json.
 */
import { execFile } from 'node:child_process'
import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { parseArgs, promisify } from 'node:util'
import { startStack } from '@/scripts/stack.mjs'
import { benchImport } from './bench-import'
import { benchPages } from './bench-pages'
import { benchRescore } from './bench-rescore'
import { type Figure, printFigures } from './figures'

const KEPT = join(import.meta.dirname, '../../.data')
const { values } = parseArgs({
  options: {
    homes: { type: 'string', default: '100000' },
    parts: { type: 'string', default: 'rescore,pages,import' },
  },
})
const parts = values.parts.split(',')
const homes = Number(values.homes)
if (!Number.isInteger(homes) || homes < 100)
  throw new RangeError('--homes takes a whole number of 100 or more')

const folder = join(KEPT, 'bench')
mkdirSync(folder, { recursive: true })
const stack = await startStack({ purpose: 'bench', today: '2026-12-01', fresh: true })
try {
  Object.assign(process.env, stack.settings, { LOG_LEVEL: 'silent', DATABASE_POOL: '10' })
  const { anOrganisation } = await import('@/tests/builders/an-organisation')
  const { loadHomes } = await import('./load-homes')
  const { manager } = await anOrganisation({ name: 'Bench Homes' })
  const tell = (what: string) => process.stdout.write(`${what}\n`)
  const figures: Figure[] = []
  const measure = async (what: string, work: () => Promise<Figure[]>) => {
    tell(`\n${what}, ${homes.toLocaleString('en-GB')} homes`)
    const found = await work()
    printFigures(found)
    figures.push(...found)
  }
  if (parts.includes('rescore') || parts.includes('pages')) {
    await loadHomes(manager, homes)
    await measure('re-score', () => benchRescore(manager, homes))
  }
  if (parts.includes('pages')) await measure('pages', () => benchPages(manager, stack.url))
  if (parts.includes('import')) await measure('import', () => benchImport(folder, homes, promisify(execFile)))
  writeFileSync(join(KEPT, 'bench.json'), `${JSON.stringify({ homes, figures }, null, 1)}\n`)
} finally {
  const { closePool } = await import('@/db/knex')
  await closePool()
  await stack.stop()
  rmSync(folder, { recursive: true, force: true })
}
process.exit(0)
