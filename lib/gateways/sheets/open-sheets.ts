import { createReadStream } from 'node:fs'
import { open } from 'node:fs/promises'
import { kindOfFile, refuseOle } from './kind-of-file'
import { openText } from './open-text'
import { openWorkbook } from './open-workbook'
import { type SheetFile } from './sheet-file'

const HEAD = 4096
/** The stream of an OLE container that holds an encrypted workbook. @source MS-OFFCRYPTO section 2.3.4.4 */
const ENCRYPTED = Buffer.from('EncryptedPackage', 'utf16le')

async function headOf(path: string): Promise<Buffer> {
  const file = await open(path)
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(HEAD), 0, HEAD, 0)
    return buffer.subarray(0, bytesRead)
  } finally {
    await file.close()
  }
}

async function holds(path: string, needle: Buffer): Promise<boolean> {
  let tail = Buffer.alloc(0)
  for await (const chunk of createReadStream(path) as AsyncIterable<Buffer>) {
    const piece = Buffer.concat([tail, chunk])
    if (piece.includes(needle)) return true
    tail = piece.subarray(-needle.length)
  }
  return false
}

/**
 * Opens a spreadsheet by what it holds, never by its name: a workbook (.xlsx, .xlsm) or separated text.
 * @throws Invalid, in words for the person who chose the file, where it is anything else, damaged, protected or a bomb
 * @example
 * const file = await openSheets('stock.xlsx')
 * for await (const row of file.rows(file.sheets[0].index)) console.log(row.number, row.cells)
 */
export async function openSheets(path: string): Promise<SheetFile> {
  const head = await headOf(path)
  switch (kindOfFile(head)) {
    case 'ole':
      throw refuseOle(await holds(path, ENCRYPTED))
    case 'zip':
      return openWorkbook(path)
    case 'text':
      return openText(path, head)
  }
}
