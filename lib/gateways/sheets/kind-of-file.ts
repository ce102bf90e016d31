/** What a file is, told from its first bytes: its name may say anything. */
import { refuseFile } from './refuse-file'

const SAVE_AS = 'Open it in your spreadsheet program and save it as .xlsx or .csv, then try again.'

/** @source the formats' own signatures: ECMA-376, PKWARE APPNOTE, MS-CFB, ISO 32000, PNG, JPEG, GIF, TIFF, RFC 1952 */
const SIGNATURES: readonly (readonly [hex: string, offset: number, kind: string])[] = [
  ['504b0304', 0, 'zip'],
  ['504b0506', 0, 'zip'],
  ['504b0708', 0, 'zip'],
  ['d0cf11e0a1b11ae1', 0, 'ole'],
  ['255044462d', 0, 'a PDF'],
  ['89504e470d0a1a0a', 0, 'a picture'],
  ['ffd8ff', 0, 'a picture'],
  ['474946383761', 0, 'a picture'],
  ['474946383961', 0, 'a picture'],
  ['49492a00', 0, 'a picture'],
  ['4d4d002a', 0, 'a picture'],
  ['52494646', 0, 'a picture or a recording'],
  ['66747970', 4, 'a picture or a recording'],
  ['1f8b', 0, 'a packed archive'],
  ['377abcaf271c', 0, 'a packed archive'],
  ['526172211a07', 0, 'a packed archive'],
  ['53514c69746520666f726d6174', 0, 'a database'],
  ['7b5c727466', 0, 'a word-processor document'],
]

/** Text that is a page or a document of another kind, whatever its name ends in. */
const OTHER_TEXT: readonly (readonly [RegExp, string])[] = [
  [
    /^\s*<(?:!doctype\s+html|html|head|body|table|meta|style|div)\b/i,
    'a web page (some systems export one under the name .xls)',
  ],
  [/^\s*<\?xml|^\s*<\w+[\s>]/i, 'an XML document'],
  [/^\s*(?:\{\s*["}]|\[\s*[{["\]])/, 'a JSON document'],
]

/**
 * Whether the file is a zip, an OLE container or text.
 * @param head the first bytes of the file, 4 KiB or the whole of it
 * @throws Invalid where it is anything else, in words that say what to do
 */
export function kindOfFile(head: Buffer): 'zip' | 'ole' | 'text' {
  if (head.length === 0) throw refuseFile('The file is empty.')
  for (const [hex, offset, kind] of SIGNATURES) {
    const bytes = Buffer.from(hex, 'hex')
    if (!head.subarray(offset, offset + bytes.length).equals(bytes)) continue
    if (kind === 'zip' || kind === 'ole') return kind
    throw refuseFile(`This is ${kind}, not a spreadsheet. ${SAVE_AS}`)
  }
  return 'text'
}

/**
 * Refuses text that is no table.
 * @param start the first few thousand characters
 * @throws Invalid for a web page, XML or JSON
 */
export function refuseOtherText(start: string): void {
  for (const [pattern, kind] of OTHER_TEXT) {
    if (pattern.test(start)) throw refuseFile(`This is ${kind}, not a spreadsheet. ${SAVE_AS}`)
  }
}

/** The refusal of an OLE container: an old workbook, or a new one behind a password. */
export const refuseOle = (encrypted: boolean) =>
  encrypted
    ? refuseFile('This workbook is protected by a password. Save a copy without one, then try again.')
    : refuseFile(`This is a workbook in the old .xls format. ${SAVE_AS}`)
