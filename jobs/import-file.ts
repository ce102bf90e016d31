/** `npm run import -- FILE --organisation SLUG [--mapping FILE] [--today DATE] [--dry-run] [--json]` */
import { access, readFile } from 'node:fs/promises'
import { parseArgs } from 'node:util'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { isRefusal } from '@/lib/errors/expected'
import { today } from '@/lib/platform/clock'
import {
  type FileImport,
  type FileImportResult,
  importFromFile,
} from '@/lib/use-cases/imports/import-from-file'
import { stopDatabase } from '@/lib/use-cases/jobs/stop-database'

const USAGE =
  'Usage: npm run import -- FILE --organisation SLUG [--mapping FILE] [--today YYYY-MM-DD] [--dry-run] [--json]'

class Wrong extends Error {}

async function readArguments(): Promise<FileImport & { json: boolean }> {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: {
      organisation: { type: 'string' },
      mapping: { type: 'string' },
      today: { type: 'string' },
      'dry-run': { type: 'boolean', default: false },
      json: { type: 'boolean', default: false },
    },
  })
  const [path] = positionals
  if (!path || positionals.length > 1) throw new Wrong(`Name one file.\n${USAGE}`)
  if (!values.organisation) throw new Wrong(`Say for which organisation.\n${USAGE}`)
  const readable = (file: string) =>
    access(file).catch(() => {
      throw new Wrong(`There is no file ${file} that can be read.`)
    })
  await readable(path)
  if (values.mapping) await readable(values.mapping)
  return {
    path,
    organisation: values.organisation,
    mapping: values.mapping ? await readFile(values.mapping, 'utf8') : undefined,
    today: values.today ? calendarDay(values.today) : today(),
    dryRun: values['dry-run'],
    json: values.json,
  }
}

/** One object: the counts, how the columns were read, and what it did or would do. */
const asJson = ({ layout, report, importId }: FileImportResult, dryRun: boolean) => ({
  ...report.tally,
  dry_run: dryRun,
  import_id: importId,
  file_kind: layout.fileKind,
  mapping: Object.fromEntries(
    Object.entries(layout.mapping).map(([field, column]) => [field, layout.headings[column] ?? null]),
  ),
  homes: report.homes,
  clashes: report.clashes,
  kept: report.kept,
})

function inWords({ layout, report }: FileImportResult, dryRun: boolean): string {
  const { tally, homes } = report
  const list = (counts: Readonly<Record<string, number>>) =>
    Object.entries(counts)
      .map(([name, count]) => `${name} ${count}`)
      .join(', ')
  return [
    `${layout.fileKind}; headings in row ${layout.headerRow}; ${tally.data_rows} rows`,
    `accepted ${tally.accepted}, rejected ${tally.rejected.length + report.clashes}`,
    `${dryRun ? 'would be' : 'were'} new ${homes.added}, changed ${homes.changed}, as they were ${homes.unchanged}`,
    `consumer unit: ${list(tally.board)}`,
    `RCD cover: ${list(tally.rcd)}`,
    `standing: ${list(tally.standing)}`,
    ...tally.rejected.map(({ row, why }) => `row ${row}: ${why}`),
  ].join('\n')
}

try {
  const { json, ...file } = await readArguments()
  const result = await importFromFile(file)
  process.stdout.write(
    `${json ? JSON.stringify(asJson(result, file.dryRun), null, 1) : inWords(result, file.dryRun)}\n`,
  )
} catch (thrown) {
  const known = isRefusal(thrown) || thrown instanceof Wrong || thrown instanceof RangeError
  const told =
    known ||
    (thrown instanceof TypeError && 'code' in thrown && String(thrown.code).startsWith('ERR_PARSE_ARGS'))
  console.error(told ? (thrown as Error).message : thrown)
  process.exitCode = 1
} finally {
  await stopDatabase()
}
