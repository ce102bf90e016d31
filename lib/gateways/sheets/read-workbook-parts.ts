/** The small parts of a workbook: its sheets, its calendar, which cell styles are dates, and its shared strings. */
import { refuseFile } from './refuse-file'
import { isDateFormat } from './is-date-format'
import { parseWholeXml } from './parse-xml'
import { type ZipParts } from './zip-parts'

const MOST_STRINGS = 4_000_000
const MOST_LETTERS = 128 * 1024 * 1024

export type SheetPart = { readonly name: string; readonly part: string }

/** A target of the relations file is relative to `xl/`, or absolute. */
const partOf = (target: string) =>
  target.startsWith('/') ? target.slice(1) : `xl/${target}`.replaceAll(/[^/]+\/\.\.\//g, '')

/**
 * The sheets that a person sees, in the order of their tabs, and whether days count from 1904.
 * @throws Invalid where every sheet is hidden
 */
export async function readSheetList(zip: ZipParts): Promise<{ sheets: SheetPart[]; epoch: 1900 | 1904 }> {
  const targets = new Map<string, string>()
  await parseWholeXml(await zip.stream('xl/_rels/workbook.xml.rels'), {
    open: (name, attributes) => {
      const { Id, Target, Type } = attributes
      if (name === 'Relationship' && Id && Target && Type?.endsWith('/worksheet'))
        targets.set(Id, partOf(Target))
    },
  })
  const sheets: SheetPart[] = []
  let epoch: 1900 | 1904 = 1900
  await parseWholeXml(await zip.stream('xl/workbook.xml'), {
    open: (name, attributes) => {
      if (name === 'workbookPr' && ['1', 'true'].includes(attributes['date1904'] ?? '')) epoch = 1904
      if (name !== 'sheet' || (attributes['state'] ?? 'visible') !== 'visible') return
      const relation = Object.keys(attributes).find((key) => key.endsWith(':id'))
      const part = targets.get(attributes[relation ?? ''] ?? '')
      if (part) sheets.push({ name: attributes['name'] ?? '', part })
    },
  })
  if (sheets.length === 0)
    throw refuseFile('The workbook shows no sheet with rows. Unhide the sheet, then try again.')
  return { sheets, epoch }
}

/** Which cell styles [0 upwards] show a number as a date. */
export async function readDateStyles(zip: ZipParts): Promise<ReadonlySet<number>> {
  const codes = new Map<number, string>()
  const dates = new Set<number>()
  let inCellStyles = false
  let style = 0
  await parseWholeXml(await zip.stream('xl/styles.xml'), {
    open: (name, attributes) => {
      if (name === 'numFmt') codes.set(Number(attributes['numFmtId']), attributes['formatCode'] ?? '')
      if (name === 'cellXfs') inCellStyles = true
      if (name !== 'xf' || !inCellStyles) return
      const format = Number(attributes['numFmtId'] ?? 0)
      if (isDateFormat(format, codes.get(format))) dates.add(style)
      style += 1
    },
    close: (name) => {
      if (name === 'cellXfs') inCellStyles = false
    },
  })
  return dates
}

/**
 * The shared strings: rich text joined, phonetic readings left out.
 * @throws Invalid where there is more text than a stock list holds
 */
export async function readSharedStrings(zip: ZipParts): Promise<readonly string[]> {
  const strings: string[] = []
  let letters = 0
  let current = ''
  let inText = false
  let inPhonetic = false
  await parseWholeXml(await zip.stream('xl/sharedStrings.xml'), {
    open: (name) => {
      if (name === 'si') current = ''
      else if (name === 't') inText = !inPhonetic
      else if (name === 'rPh') inPhonetic = true
    },
    text: (text) => {
      if (!inText) return
      letters += text.length
      if (letters > MOST_LETTERS) throw refuseFile('The workbook holds more text than a stock list can.')
      current += text
    },
    close: (name) => {
      if (name === 't') inText = false
      else if (name === 'rPh') inPhonetic = false
      else if (name === 'si' && strings.push(unescapeText(current)) > MOST_STRINGS)
        throw refuseFile('The workbook holds more text than a stock list can.')
    },
  })
  return strings
}

/**
 * The letters that a workbook writes as `_xHHHH_`.
 * @source ECMA-376 Part 1, 22.9.2.19 ST_Xstring
 * @example unescapeText('one_x000D_two') // 'one\rtwo'
 */
export const unescapeText = (text: string): string =>
  text.includes('_x')
    ? text.replaceAll(/_x([0-9A-Fa-f]{4})_/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)))
    : text
