/** The parts of a zipped workbook, with the caps that keep a bomb from going off. */
import { type Readable } from 'node:stream'
import { type Entry, openPromise, type ZipFile } from 'yauzl'
import { refuseFile } from './refuse-file'

const MOST_ENTRIES = 2000
const MOST_UNPACKED = 1.5 * 1024 ** 3
/** A sheet of like rows packs to about a hundredth; nothing honest of this size packs further than this. */
const MOST_RATIO = 300
const RATIO_FROM = 1024 ** 2

const DAMAGED = 'The workbook is damaged and cannot be opened. Save it again, or export it as .csv.'
const TOO_LARGE = 'The workbook unpacks to far more than a stock list can be, so it is not opened.'

export type ZipParts = {
  readonly names: readonly string[]
  /** the unpacked bytes of a part, or null where there is no such part; names are matched without case */
  stream(name: string): Promise<AsyncGenerator<Buffer> | null>
  close(): void
}

/** The limits are checked on what the central directory claims, before anything is unpacked. */
async function entriesOf(zip: ZipFile): Promise<Map<string, Entry>> {
  if (zip.entryCount > MOST_ENTRIES) throw refuseFile(TOO_LARGE)
  const entries = new Map<string, Entry>()
  let total = 0
  for await (const entry of zip.eachEntry()) {
    total += entry.uncompressedSize
    const ratio = entry.uncompressedSize / Math.max(1, entry.compressedSize)
    if (entries.size >= MOST_ENTRIES || total > MOST_UNPACKED) throw refuseFile(TOO_LARGE)
    if (entry.uncompressedSize > RATIO_FROM && ratio > MOST_RATIO) throw refuseFile(TOO_LARGE)
    if (entry.isEncrypted())
      throw refuseFile('This workbook is protected by a password. Save a copy without one, then try again.')
    entries.set(entry.fileName.toLowerCase(), entry)
  }
  return entries
}

/** What comes out is counted too: a directory that lies about a size does not get past this. */
async function* counted(stream: Readable, entry: Entry): AsyncGenerator<Buffer> {
  const most = Math.min(MOST_UNPACKED, Math.max(RATIO_FROM, entry.compressedSize * MOST_RATIO))
  let size = 0
  try {
    for await (const chunk of stream as AsyncIterable<Buffer>) {
      size += chunk.length
      if (size > most || size > entry.uncompressedSize) throw refuseFile(TOO_LARGE)
      yield chunk
    }
  } catch (thrown) {
    throw asRefusal(thrown)
  } finally {
    stream.destroy()
  }
}

/** The zip reader throws plain errors at bytes that make no sense; those are the file's fault, not ours. */
function asRefusal(thrown: unknown): unknown {
  if (!(thrown instanceof Error) || 'kind' in thrown) return thrown
  if (/too many bytes in the stream/.test(thrown.message)) return refuseFile(TOO_LARGE)
  return refuseFile(DAMAGED)
}

/**
 * Opens a zip file and reads its directory.
 * @throws Invalid where it is damaged, protected, or would unpack to more than the caps allow
 */
export async function openZipParts(path: string): Promise<ZipParts> {
  let zip: ZipFile | null = null
  try {
    zip = await openPromise(path, { autoClose: false, lazyEntries: true, validateEntrySizes: true })
    const opened = zip
    const entries = await entriesOf(opened)
    return {
      names: [...entries.keys()],
      async stream(name) {
        const entry = entries.get(name.toLowerCase())
        if (!entry) return null
        try {
          return counted(await opened.openReadStreamPromise(entry), entry)
        } catch (thrown) {
          throw asRefusal(thrown)
        }
      },
      close: () => opened.close(),
    }
  } catch (thrown) {
    zip?.close()
    throw asRefusal(thrown)
  }
}
