import { type SheetRow } from '@/lib/imports/cell'
import { type WorkbookContext, readSheetRows } from './read-sheet-rows'
import { readDateStyles, readSharedStrings, readSheetList } from './read-workbook-parts'
import { refuseFile } from './refuse-file'
import { type SheetFile } from './sheet-file'
import { openZipParts, type ZipParts } from './zip-parts'

const SAVE_AS = 'Open it in your spreadsheet program and save it as .xlsx or .csv, then try again.'

/** A zip without a workbook's main part is some other document. */
async function refuseOtherZip(zip: ZipParts): Promise<void> {
  const names = new Set(zip.names)
  if (names.has('xl/workbook.xml')) return
  if (names.has('xl/workbook.bin')) throw refuseFile(`This is a binary workbook (.xlsb). ${SAVE_AS}`)
  if (names.has('word/document.xml'))
    throw refuseFile('This is a word-processor document, not a spreadsheet.')
  if (names.has('mimetype')) {
    let type = ''
    for await (const chunk of (await zip.stream('mimetype')) ?? []) type += chunk.toString('latin1')
    if (type.includes('opendocument.spreadsheet'))
      throw refuseFile(`This is an OpenDocument spreadsheet (.ods). ${SAVE_AS}`)
  }
  throw refuseFile(`This is a zip archive, not a spreadsheet. Unpack it and choose the spreadsheet inside.`)
}

/**
 * Opens a workbook: its visible sheets, each read as a stream.
 * @throws Invalid where it is damaged, protected, a bomb, or another kind of zip
 */
export async function openWorkbook(path: string): Promise<SheetFile> {
  const zip = await openZipParts(path)
  try {
    await refuseOtherZip(zip)
    const { sheets, epoch } = await readSheetList(zip)
    const dateStyles = await readDateStyles(zip)
    let strings: Promise<readonly string[]> | undefined

    async function* rows(index: number): AsyncGenerator<SheetRow> {
      const sheet = sheets[index]
      const part = sheet && (await zip.stream(sheet.part))
      if (!part) throw refuseFile('The workbook has no such sheet.')
      strings ??= readSharedStrings(zip)
      const context: WorkbookContext = { strings: await strings, dateStyles, epoch }
      yield* readSheetRows(part, context)
    }

    return {
      kind: 'xlsx',
      sheets: sheets.map(({ name }, index) => ({ name, index })),
      rows,
      async preview(index, most) {
        const first: SheetRow[] = []
        for await (const row of rows(index)) if (first.push(row) >= most) break
        return first
      },
      remarks: () => [],
      close: async () => zip.close(),
    }
  } catch (thrown) {
    zip.close()
    throw thrown
  }
}
