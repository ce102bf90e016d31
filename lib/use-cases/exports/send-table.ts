import { PassThrough, Readable } from 'node:stream'
import { writeCsv } from '@/lib/gateways/sheets/write-csv'
import { writeXlsx } from '@/lib/gateways/sheets/write-xlsx'
import { log } from '@/lib/platform/log'

export const TABLE_FORMATS = ['csv', 'xlsx'] as const
export type TableFormat = (typeof TABLE_FORMATS)[number]

const TYPES: Record<TableFormat, string> = {
  csv: 'text/csv; charset=utf-8',
  xlsx: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
}

export type TableFile = {
  readonly name: string
  readonly format: TableFormat
  readonly headings: readonly string[]
  readonly rows: AsyncIterable<readonly (string | number | null)[]>
}

/** A table as a file to save, written as it is read: the whole of it is never in memory. */
export function sendTable({ name, format, headings, rows }: TableFile): Response {
  const output = new PassThrough()
  const write = format === 'csv' ? writeCsv : writeXlsx
  write(headings, rows, output).catch((thrown: unknown) => {
    log().error(
      { error: thrown instanceof Error ? thrown.message : String(thrown) },
      'a file could not be written to its end',
    )
    output.destroy(thrown instanceof Error ? thrown : new Error(String(thrown)))
  })
  const file = `${name.replace(/[^\p{L}\p{N} ._-]/gu, '').trim() || 'table'}.${format}`
  return new Response(Readable.toWeb(output) as ReadableStream, {
    headers: {
      'Content-Type': TYPES[format],
      'Content-Disposition': `attachment; filename="${file.replace(/[^\x20-\x7e]/g, '_')}"; filename*=UTF-8''${encodeURIComponent(file)}`,
      'X-Content-Type-Options': 'nosniff',
    },
  })
}
