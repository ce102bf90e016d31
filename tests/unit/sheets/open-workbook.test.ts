// Cell types, strings, styles and dates as ECMA-376 Part 1 describes them: 18.3.1.4, 18.4, 18.8.30, 18.17.4.1, 22.9.2.19.
import { describe, expect, it } from 'vitest'
import { Invalid } from '@/lib/errors/expected'
import { isDateFormat } from '@/lib/gateways/sheets/is-date-format'
import { openSheets } from '@/lib/gateways/sheets/open-sheets'
import { buildZip, fileOf, workbookFile, workbookParts, type WorkbookParts } from './build-zip'

const cellsOf = async (data: string, parts: Omit<WorkbookParts, 'sheets'> = {}) => {
  const file = await openSheets(workbookFile({ sheets: [{ name: 'Stock', data }], ...parts }))
  const rows = await file.preview(0, 100)
  await file.close()
  return rows.map((row) => row.cells)
}

describe('the cells of a workbook', () => {
  it('shared strings: plain, rich, with spaces kept, phonetic readings left out', async () => {
    const strings = `<si><t>Ropewalk</t></si><si><r><t>rewire</t></r><r><rPr><b/></rPr><t xml:space="preserve">able </t></r></si>
      <si><t>A</t><rPh sb="0" eb="1"><t>hidden</t></rPh></si><si><t/></si><si><t>a &amp; b &lt;c&gt; &#233;</t></si>`
    const data =
      '<row r="1"><c r="A1" t="s"><v>0</v></c><c r="B1" t="s"><v>1</v></c><c r="C1" t="s"><v>2</v></c><c r="D1" t="s"><v>3</v></c><c r="E1" t="s"><v>4</v></c></row>'
    expect(await cellsOf(data, { strings })).toEqual(
      [['Ropewalk', 'rewireable ', 'A', null, 'a & b <c> é']].map((row) => row),
    )
  })

  it('inline strings, booleans, errors, numbers, formulas by their stored result', async () => {
    const data = `<row r="3"><c r="A3" t="inlineStr"><is><t>in</t><r><t>line</t></r></is></c><c r="B3" t="b"><v>1</v></c>
      <c r="C3" t="e"><v>#REF!</v></c><c r="D3"><v>100099000005</v></c><c r="E3"><f>SUM(A1:A2)</f><v>3</v></c>
      <c r="F3" t="str"><f>A1&amp;"x"</f><v>x_x000D_y_x005F_x0041_</v></c><c r="G3"><f>A1</f></c><c r="H3" t="d"><v>2020-05-03T00:00:00</v></c></row>`
    expect(await cellsOf(data)).toEqual([
      ['inline', true, { error: '#REF!' }, 100099000005, 3, 'x\ry_x0041_', null, '2020-05-03T00:00:00'],
    ])
  })

  it('dates by their number format, in either epoch', async () => {
    const styles = `<numFmts><numFmt numFmtId="164" formatCode="dd\\/mm\\/yyyy"/><numFmt numFmtId="165" formatCode="0.0 &quot;days&quot;"/></numFmts>
      <cellStyleXfs><xf numFmtId="14"/></cellStyleXfs><cellXfs><xf numFmtId="0"/><xf numFmtId="14"/><xf numFmtId="164"/><xf numFmtId="165"/></cellXfs>`
    const data = [0, 1, 2, 3]
      .map((style, at) => `<c r="${'ABCD'[at]}1" s="${style}"><v>44878</v></c>`)
      .join('')
    const date = (epoch: 1900 | 1904) => ({ serial: 44878, epoch })
    expect(await cellsOf(`<row r="1">${data}</row>`, { styles })).toEqual([
      [44878, date(1900), date(1900), 44878],
    ])
    expect(await cellsOf(`<row r="1">${data}</row>`, { styles, date1904: true })).toEqual([
      [44878, date(1904), date(1904), 44878],
    ])
  })

  it('gaps are empty cells, and rows keep the numbers that a person sees', async () => {
    const file = await openSheets(
      workbookFile({
        sheets: [
          {
            name: 'S',
            data: '<row r="4"><c r="C4"><v>1</v></c></row><row r="9"><c r="AA9"><v>2</v></c></row>',
          },
        ],
      }),
    )
    const rows = await file.preview(0, 10)
    expect(rows[0]).toEqual({ number: 4, cells: [null, null, 1] })
    expect(rows[1]?.number).toBe(9)
    expect(rows[1]?.cells).toHaveLength(27)
  })

  it('rows and cells without addresses are counted, and a prefix on names is passed over', async () => {
    expect(
      await cellsOf('<row><c><v>1</v></c><c><v>2</v></c></row><x:row><x:c><x:v>3</x:v></x:c></x:row>'),
    ).toEqual([[1, 2], [3]])
  })

  it('hidden sheets are not shown, and the order is that of the tabs', async () => {
    const sheet = (name: string, state?: string) => ({
      name,
      state,
      data: `<row r="1"><c r="A1" t="inlineStr"><is><t>${name}</t></is></c></row>`,
    })
    const file = await openSheets(
      workbookFile({
        sheets: [
          sheet('One'),
          sheet('Secret', 'hidden'),
          sheet('Very', 'veryHidden'),
          sheet('Two &amp; three'),
        ],
      }),
    )
    expect(file.sheets).toEqual([
      { name: 'One', index: 0 },
      { name: 'Two & three', index: 1 },
    ])
    expect((await file.preview(1, 1))[0]?.cells).toEqual(['Two & three'])
  })

  it('a stream that is left early can be read again', async () => {
    const data = Array.from(
      { length: 2000 },
      (_, at) => `<row r="${at + 1}"><c r="A${at + 1}"><v>${at}</v></c></row>`,
    ).join('')
    const file = await openSheets(workbookFile({ sheets: [{ name: 'S', data }] }))
    expect(await file.preview(0, 3)).toHaveLength(3)
    let rows = 0
    for await (const row of file.rows(0)) rows = row.number
    expect(rows).toBe(2000)
    await file.close()
  })
})

describe('a workbook that is refused', () => {
  const good = { sheets: [{ name: 'S', data: '<row r="1"><c r="A1"><v>1</v></c></row>' }] }
  const reading = async (path: string) => {
    const file = await openSheets(path)
    for await (const row of file.rows(0)) void row
  }

  it.each<[string, () => string, RegExp]>([
    ['all sheets hidden', () => workbookFile({ sheets: [{ name: 'S', state: 'hidden', data: '' }] }), /shows no sheet/],
    ['a document type', () => workbookFile({ sheets: [{ name: 'S', data: '' }], more: [{ name: 'xl/styles.xml', body: '<!DOCTYPE x [<!ENTITY a "aa">]><styleSheet/>' }] }), /damaged/],
    ['an entity', () => workbookFile({ sheets: [{ name: 'S', data: '<row r="1"><c r="A1"><v>&lol;</v></c></row>' }] }), /damaged/],
    ['cut off XML', () => workbookFile({ sheets: [{ name: 'S', data: '<row r="1"><c>' }] }), /damaged/],
    ['a cut off file', () => fileOf(buildZip(workbookParts(good)).subarray(0, 400)), /damaged/],
    ['too many columns', () => workbookFile({ sheets: [{ name: 'S', data: '<row r="1"><c r="ZZZ1"><v>1</v></c></row>' }] }), /more than 500 columns/],
    ['a password', () => fileOf(buildZip(workbookParts(good).map((part) => ({ ...part, encrypted: true })))), /password/],
    ['a word-processor document', () => fileOf(buildZip([{ name: 'word/document.xml', body: '<x/>' }])), /word-processor/],
    ['a binary workbook', () => fileOf(buildZip([{ name: 'xl/workbook.bin', body: 'x' }])), /\.xlsb/],
    ['an OpenDocument spreadsheet', () => fileOf(buildZip([{ name: 'mimetype', body: 'application/vnd.oasis.opendocument.spreadsheet' }, { name: 'content.xml', body: '<x/>' }])), /\.ods/],
    ['some other archive', () => fileOf(buildZip([{ name: 'photo.jpg', body: 'x' }])), /zip archive/],
    ['an empty archive', () => fileOf(buildZip([])), /zip archive/],
    ['a million spaces packed small', () => workbookFile({ ...good, more: [{ name: 'xl/bomb.xml', body: Buffer.alloc(40 * 1024 * 1024, 32) }] }), /unpacks to far more/],
    ['a directory that claims terabytes', () => workbookFile({ ...good, more: Array.from({ length: 3 }, (_, at) => ({ name: `a${at}`, body: 'x', claims: 0xfffffff0 })) }), /unpacks to far more/],
    ['thousands of parts', () => workbookFile({ ...good, more: Array.from({ length: 2001 }, (_, at) => ({ name: `a${at}`, body: '' })) }), /unpacks to far more/],
  ])('%s', async (_, make, problem) => {
    const refusal = reading(make())
    await expect(refusal).rejects.toBeInstanceOf(Invalid)
    await expect(refusal).rejects.toThrow(problem)
  }) // prettier-ignore

  it('a directory that claims less than comes out is caught while it comes out', async () => {
    const spaces = `<row r="1"><c r="A1" t="inlineStr"><is><t>${' '.repeat(30 * 1024 * 1024)}</t></is></c></row>`
    const parts = workbookParts({ sheets: [{ name: 'S', data: spaces }] })
    const lying = parts.map((part) => (part.name.includes('worksheets') ? { ...part, claims: 2000 } : part))
    await expect(reading(fileOf(buildZip(lying)))).rejects.toThrow(/unpacks to far more/)
  })

  it('a directory that claims more than comes out is damage', async () => {
    const lying = workbookParts(good).map((part) =>
      part.name.includes('worksheets') ? { ...part, claims: 100_000 } : part,
    )
    await expect(reading(fileOf(buildZip(lying)))).rejects.toBeInstanceOf(Invalid)
  })

  it('shared strings that say too much are refused as they are read', async () => {
    await expect(reading(workbookFile({ ...good, strings: '<si><t>&nbsp;</t></si>' }))).rejects.toThrow(
      /damaged/,
    )
  })

  it('a workbook with macros is read like any other: they are never run', async () => {
    const file = await openSheets(
      workbookFile({ ...good, more: [{ name: 'xl/vbaProject.bin', body: 'macro' }] }),
    )
    expect(await file.preview(0, 1)).toEqual([{ number: 1, cells: [1] }])
  })
})

describe('a number format that shows a date', () => {
  it.each<[number, string | undefined, boolean]>([
    [0, undefined, false], [14, undefined, true], [22, undefined, true], [20, undefined, false], [46, undefined, false], [57, undefined, true],
    [164, 'dd/mm/yyyy;@', true], [164, 'mmm-yy', true], [164, '[$-809]d mmmm yyyy', true], [164, 'mmmm', true], [164, 'hh:mm:ss', false],
    [164, '[h]:mm', false], [164, 'General', false], [164, '#,##0.00', false], [164, '[Red]#,##0 "days"', false], [164, '0 \\d', false],
    [164, '_-£* #,##0_-', false], [164, 'yyyy', true], [164, '', false],
  ])('%d %j: %j', (id, code, expected) => {
    expect(isDateFormat(id, code)).toBe(expected)
  }) // prettier-ignore
})
