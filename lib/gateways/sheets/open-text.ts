/** Comma, semicolon, tab or bar separated text as one sheet, read as a stream. */
import { createReadStream } from 'node:fs'
import { open } from 'node:fs/promises'
import { Readable } from 'node:stream'
import { CsvError, type InfoRecord, parse } from 'csv-parse'
import { type SheetRow } from '@/lib/imports/cell'
import { detectEncoding } from './detect-encoding'
import { guessDelimiter } from './guess-delimiter'
import { refuseOtherText } from './kind-of-file'
import { refuseFile } from './refuse-file'
import { MOST_COLUMNS, type SheetFile, type TextEncoding } from './sheet-file'

const LONGEST_LINE = 1024 * 1024
const START = 64 * 1024
const MOST_REMARKS = 20

type Parsed = { readonly info: InfoRecord; readonly record: readonly string[] }

async function* decoded(path: string, encoding: TextEncoding): AsyncGenerator<string> {
  const decoder = new TextDecoder(encoding)
  for await (const chunk of createReadStream(path) as AsyncIterable<Buffer>) {
    const text = decoder.decode(chunk, { stream: true })
    if (text !== '') yield text
  }
  const rest = decoder.decode()
  if (rest !== '') yield rest
}

async function startOf(path: string, encoding: TextEncoding): Promise<string> {
  const file = await open(path)
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(START), 0, START, 0)
    return new TextDecoder(encoding).decode(buffer.subarray(0, bytesRead), { stream: true })
  } finally {
    await file.close()
  }
}

function refusalOf(thrown: unknown): unknown {
  if (!(thrown instanceof CsvError)) return thrown
  const line = Number(thrown.lines ?? 0)
  if (thrown.code === 'CSV_MAX_RECORD_SIZE')
    return refuseFile(
      `Near line ${line} a row is longer than a million characters: is a quotation mark never closed?`,
    )
  if (thrown.code === 'CSV_QUOTE_NOT_CLOSED')
    return refuseFile(
      'A quotation mark is opened and never closed, so the rest of the file reads as one cell.',
    )
  return refuseFile(`The file cannot be read as a table near line ${line}.`)
}

/**
 * Opens a text file as one sheet.
 * @param head its first bytes
 * @throws Invalid where it is empty, no text, or a document of another kind
 */
export async function openText(path: string, head: Buffer): Promise<SheetFile> {
  const encoding = await detectEncoding(path, head)
  const start = await startOf(path, encoding)
  if (start.trim() === '') throw refuseFile('The file is empty.')
  refuseOtherText(start)
  const delimiter = guessDelimiter(start)
  const remarks: string[] = []
  const remark = (text: string) => {
    if (remarks.length < MOST_REMARKS) remarks.push(text)
  }

  async function* rows(): AsyncGenerator<SheetRow> {
    remarks.length = 0
    const source = Readable.from(decoded(path, encoding))
    const parser = source.pipe(
      parse({
        delimiter,
        info: true,
        relax_quotes: true,
        relax_column_count: true,
        skip_empty_lines: false,
        record_delimiter: ['\r\n', '\n', '\r'],
        max_record_size: LONGEST_LINE,
      }),
    )
    source.on('error', (fault) => parser.destroy(fault))
    let startsAt = 1
    try {
      for await (const { info, record } of parser as AsyncIterable<Parsed>) {
        if (record.length > MOST_COLUMNS)
          throw refuseFile(`Line ${startsAt} has ${record.length} columns; the most is ${MOST_COLUMNS}.`)
        if (record.some((cell) => cell.includes('"')))
          remark(
            `Line ${startsAt} has a quotation mark inside a cell; check that its cells are parted rightly.`,
          )
        yield { number: startsAt, cells: record.map((cell) => (cell === '' ? null : cell)) }
        startsAt = info.lines + 1
      }
    } catch (thrown) {
      throw refusalOf(thrown)
    } finally {
      source.destroy()
      parser.destroy()
    }
  }

  return {
    kind: 'text',
    encoding,
    delimiter,
    sheets: [{ name: '', index: 0 }],
    rows,
    async preview(_index, most) {
      const first: SheetRow[] = []
      for await (const row of rows()) if (first.push(row) >= most) break
      return first
    },
    remarks: () => remarks,
    close: async () => {},
  }
}
