/** Zip files made byte by byte, so that a test can make one that lies. @source PKWARE APPNOTE 4.3 */
import { mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { deflateRawSync } from 'node:zlib'

/** `claims` is the unpacked size that the headers state, where it is not the true one. */
export type ZipPart = {
  readonly name: string
  readonly body: string | Buffer
  readonly claims?: number
  readonly encrypted?: boolean
}

const crcTable = Uint32Array.from({ length: 256 }, (_, n) => {
  let c = n
  for (let bit = 0; bit < 8; bit++) c = c & 1 ? 0xedb88320 ^ (c >>> 1) : c >>> 1
  return c >>> 0
})
const crc32 = (bytes: Buffer) =>
  ~bytes.reduce((crc, byte) => (crcTable[(crc ^ byte) & 0xff] ?? 0) ^ (crc >>> 8), -1) >>> 0

export function buildZip(parts: readonly ZipPart[]): Buffer {
  const locals: Buffer[] = []
  const directory: Buffer[] = []
  let offset = 0
  for (const { name, body, claims, encrypted } of parts) {
    const raw = Buffer.from(body)
    const packed = deflateRawSync(raw)
    const fields = Buffer.alloc(26)
    fields.writeUInt16LE(20, 0)
    fields.writeUInt16LE(encrypted ? 1 : 0, 2)
    fields.writeUInt16LE(8, 4)
    fields.writeUInt32LE(raw.length > 1e7 ? 0 : crc32(raw), 10)
    fields.writeUInt32LE(packed.length, 14)
    fields.writeUInt32LE(claims ?? raw.length, 18)
    fields.writeUInt16LE(Buffer.byteLength(name), 22)
    const tail = Buffer.alloc(14)
    tail.writeUInt32LE(offset, 10)
    const local = Buffer.concat([Buffer.from('PK\x03\x04', 'latin1'), fields, Buffer.from(name), packed])
    directory.push(
      Buffer.concat([Buffer.from('PK\x01\x02\x14\x00', 'latin1'), fields, tail, Buffer.from(name)]),
    )
    locals.push(local)
    offset += local.length
  }
  const listed = Buffer.concat(directory)
  const end = Buffer.alloc(18)
  end.writeUInt16LE(parts.length, 4)
  end.writeUInt16LE(parts.length, 6)
  end.writeUInt32LE(listed.length, 8)
  end.writeUInt32LE(offset, 12)
  return Buffer.concat([...locals, listed, Buffer.from('PK\x05\x06', 'latin1'), end])
}

const folder = mkdtempSync(join(tmpdir(), 'sheets-'))
let files = 0

/** A file with these bytes, under a name that says nothing. */
export function fileOf(bytes: string | Buffer): string {
  const path = join(folder, `file-${++files}.bin`)
  writeFileSync(path, bytes)
  return path
}

const MAIN = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main'
const RELATIONS = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships'

export type WorkbookParts = {
  readonly sheets: readonly { readonly name: string; readonly state?: string; readonly data: string }[]
  readonly strings?: string
  readonly styles?: string
  readonly date1904?: boolean
  readonly more?: readonly ZipPart[]
}

/** The parts of a workbook; `data` is the inside of a sheet's sheetData. */
export function workbookParts({ sheets, strings, styles, date1904, more = [] }: WorkbookParts): ZipPart[] {
  const list = sheets.map(
    ({ name, state }, at) =>
      `<sheet name="${name}" sheetId="${at + 1}" ${state ? `state="${state}"` : ''} r:id="r${at}"/>`,
  )
  const relations = sheets.map(
    (_, at) => `<Relationship Id="r${at}" Type="${RELATIONS}/worksheet" Target="worksheets/s${at}.xml"/>`,
  )
  const workbook = `<workbook xmlns="${MAIN}" xmlns:r="${RELATIONS}"><workbookPr ${date1904 ? 'date1904="1"' : ''}/><sheets>${list.join('')}</sheets></workbook>`
  return [
    { name: 'xl/workbook.xml', body: workbook },
    { name: 'xl/_rels/workbook.xml.rels', body: `<Relationships>${relations.join('')}</Relationships>` },
    ...sheets.map(({ data }, at) => ({
      name: `xl/worksheets/s${at}.xml`,
      body: `<worksheet xmlns="${MAIN}"><sheetData>${data}</sheetData></worksheet>`,
    })),
    ...(strings === undefined
      ? []
      : [{ name: 'xl/sharedStrings.xml', body: `<sst xmlns="${MAIN}">${strings}</sst>` }]),
    ...(styles === undefined
      ? []
      : [{ name: 'xl/styles.xml', body: `<styleSheet xmlns="${MAIN}">${styles}</styleSheet>` }]),
    ...more,
  ]
}

export const workbookFile = (parts: WorkbookParts) => fileOf(buildZip(workbookParts(parts)))
