// Byte-order marks: Unicode 16.0, 23.8. Windows-1252: WHATWG Encoding. Quoting: RFC 4180.
import { describe, expect, it } from 'vitest'
import { Invalid } from '@/lib/errors/expected'
import { guessDelimiter } from '@/lib/gateways/sheets/guess-delimiter'
import { openSheets } from '@/lib/gateways/sheets/open-sheets'
import { fileOf } from './build-zip'

const utf16be = (text: string) => Buffer.from(text, 'utf16le').swap16()
const ENCODINGS = [
  ['UTF-8 without a mark', 'utf-8', (text: string) => Buffer.from(text)],
  ['UTF-8 with a mark', 'utf-8', (text: string) => Buffer.from(`\uFEFF${text}`)],
  ['UTF-16 LE with a mark', 'utf-16le', (text: string) => Buffer.from(`\uFEFF${text}`, 'utf16le')],
  ['UTF-16 BE with a mark', 'utf-16be', (text: string) => utf16be(`\uFEFF${text}`)],
  ['UTF-16 LE without a mark', 'utf-16le', (text: string) => Buffer.from(text, 'utf16le')],
  ['Windows-1252', 'windows-1252', (text: string) => Buffer.from(text.replaceAll('’', '\x92'), 'latin1')],
] as const
const DELIMITERS = [',', ';', '\t', '|'] as const
const TABLE = [
  ['Address', 'P’code', 'Note'],
  ['4, Lantern Lane; rear', 'ZX2 3QT', 'café "below"'],
  ['7 Cooper’s Yard', '', 'two\nlines'],
  ['9 Fore Street', 'ZX1 5BB', '| bar, and; more'],
]
const written = (delimiter: string, ending = '\r\n') =>
  TABLE.map((row) =>
    row.map((cell) => (/["\n,;\t|]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell)).join(delimiter),
  ).join(ending)

const rowsOf = async (bytes: string | Buffer) => {
  const file = await openSheets(fileOf(bytes))
  return { file, rows: await file.preview(0, 1000) }
}

describe.each(ENCODINGS)('%s', (_, encoding, encode) => {
  it.each(DELIMITERS)('parted by %j', async (delimiter) => {
    const { file, rows } = await rowsOf(encode(written(delimiter)))
    expect(file).toMatchObject({ kind: 'text', encoding, delimiter, sheets: [{ name: '', index: 0 }] })
    expect(rows.map((row) => row.cells)).toEqual(TABLE.map((row) => row.map((cell) => cell || null)))
  })
})

describe('the rows of a text file', () => {
  it('are numbered by the line they start on', async () => {
    const { rows } = await rowsOf('Address,Note\n1 Ropewalk,"two\nlines"\n\n2 Ropewalk,\n')
    expect(rows.map((row) => row.number)).toEqual([1, 2, 4, 5])
  })

  it.each(['\n', '\r\n', '\r'])('may end in %j', async (ending) => {
    const { rows } = await rowsOf(`Address,Built${ending}1 Ropewalk,1931${ending}2 Ropewalk,1932${ending}`)
    expect(rows.map((row) => row.cells)).toEqual([
      ['Address', 'Built'],
      ['1 Ropewalk', '1931'],
      ['2 Ropewalk', '1932'],
    ])
    expect(rows.map((row) => row.number)).toEqual([1, 2, 3])
  })

  it('may be ragged, and a stray quotation mark is read and told', async () => {
    const { file, rows } = await rowsOf('Address,Note\n1 Ropewalk,the 5" pipe,more\n2 Ropewalk\n')
    expect(rows.map((row) => row.cells)).toEqual([
      ['Address', 'Note'],
      ['1 Ropewalk', 'the 5" pipe', 'more'],
      ['2 Ropewalk'],
    ])
    expect(file.remarks()).toEqual([expect.stringMatching(/^Line 2 has a quotation mark/)])
  })

  it('may be one column', async () => {
    const { file, rows } = await rowsOf('Address\n1 Ropewalk\n2 Ropewalk\n')
    expect(file.delimiter).toBe(',')
    expect(rows).toHaveLength(3)
  })

  it('a Windows-1252 letter near the end is still found', async () => {
    const bytes = Buffer.concat([
      Buffer.from(`Address,Note\n${'1 Ropewalk,plain\n'.repeat(9000)}`),
      Buffer.from('9 Fore Street,caf\xe9\n', 'latin1'),
    ])
    const file = await openSheets(fileOf(bytes))
    expect(file.encoding).toBe('windows-1252')
    let last: readonly unknown[] = []
    for await (const row of file.rows(0)) last = row.cells
    expect(last).toEqual(['9 Fore Street', 'café'])
  })

  it('a letter that is cut by the edge of a piece stays whole', async () => {
    const { rows } = await rowsOf(`Address,Note\n${'é'.repeat(100_001)},x\n`)
    expect(rows[1]?.cells[0]).toBe('é'.repeat(100_001))
  })
})

describe('a file that is refused', () => {
  it.each<[string, string | Buffer, RegExp]>([
    ['an empty file', '', /empty/],
    ['a file of blanks', ' \r\n\r\n', /empty/],
    ['a mark and nothing else', '\uFEFF', /empty/],
    ['an old workbook', Buffer.from('d0cf11e0a1b11ae1' + '00'.repeat(600), 'hex'), /old \.xls/],
    ['a workbook behind a password', Buffer.concat([Buffer.from('d0cf11e0a1b11ae1', 'hex'), Buffer.alloc(70_000), Buffer.from('EncryptedPackage', 'utf16le')]), /password/],
    ['a PDF', '%PDF-1.7\n%âãÏÓ', /a PDF/],
    ['a picture', Buffer.from('89504e470d0a1a0a0000', 'hex'), /a picture/],
    ['a photograph', Buffer.from('ffd8ffe000104a46494600', 'hex'), /a picture/],
    ['a packed archive', Buffer.from('1f8b0800000000000003', 'hex'), /archive/],
    ['a web page called .xls', '<html xmlns:x="urn"><table><tr><td>1</td></tr></table></html>', /web page/],
    ['a web page with its type', '\n<!DOCTYPE html><p>hello', /web page/],
    ['XML', '<?xml version="1.0"?><Workbook/>', /XML/],
    ['JSON', '[{"address":"1 Ropewalk"}]', /JSON/],
    ['binary junk', Buffer.from(Array.from({ length: 3000 }, (_, at) => (at * 7919) % 256)), /neither a workbook nor text/],
    ['control characters', Buffer.from(`Address\n${'\x01\x02\x03\x04'.repeat(300)}`), /neither a workbook nor text/],
    ['a line without an end', `Address,Note\n${'x'.repeat(1_200_000)}`, /longer than a million/],
    ['a quotation mark never closed', `Address,Note\n"1 Ropewalk,x\n2 Ropewalk,y\n`, /never closed/],
    ['too many columns', `${'a,'.repeat(600)}a\n`, /601 columns/],
  ])('%s', async (_, bytes, problem) => {
    const reading = rowsOf(bytes)
    await expect(reading).rejects.toBeInstanceOf(Invalid)
    await expect(reading).rejects.toThrow(problem)
  }) // prettier-ignore
})

describe('what parts the cells', () => {
  it.each([
    ['Address;Built\n"4, Lantern Lane";1958\n', ';'],
    ['sep=|\nAddress|Note\n1, 2, 3|x\n', '|'],
    ['A title, with a comma\n\nAddress\tBuilt\tType\n1 Ropewalk\t1931\tsemi\n', '\t'],
    ['1 Ropewalk, Quillhaven;1931\n2 Ropewalk, Quillhaven;1932\n3 Ropewalk, Quillhaven;1933;\n', ','],
    ['', ','],
  ])('%j: %j', (text, delimiter) => {
    expect(guessDelimiter(text)).toBe(delimiter)
  })
})
