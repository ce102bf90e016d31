import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fetchFile } from '@/lib/gateways/files'
import { openSheets } from '@/lib/gateways/sheets/open-sheets'
import { type SheetFile } from '@/lib/gateways/sheets/sheet-file'

/** Runs some work in a folder of its own, which is gone afterwards. */
export async function inScratchFolder<T>(work: (folder: string) => Promise<T>): Promise<T> {
  const folder = await mkdtemp(join(tmpdir(), 'fuseward-'))
  try {
    return await work(folder)
  } finally {
    await rm(folder, { recursive: true, force: true })
  }
}

/** Opens a local file as sheets, and closes it after the work. */
export async function withSheets<T>(path: string, work: (sheets: SheetFile) => Promise<T>): Promise<T> {
  const sheets = await openSheets(path)
  try {
    return await work(sheets)
  } finally {
    await sheets.close()
  }
}

/** Opens a stored file as sheets. */
export const withStoredSheets = <T>(key: string, work: (sheets: SheetFile) => Promise<T>): Promise<T> =>
  inScratchFolder(async (folder) => {
    const path = join(folder, 'upload')
    await fetchFile(key, path)
    return withSheets(path, work)
  })
