// Formula injection: CWE-1236 and the characters listed for it there.
import { createWriteStream, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { type OutCell, neutralCell } from '@/lib/gateways/sheets/neutral-cell'
import { openSheets } from '@/lib/gateways/sheets/open-sheets'
import { writeCsv } from '@/lib/gateways/sheets/write-csv'
import { writeXlsx } from '@/lib/gateways/sheets/write-xlsx'
import { cellText } from '@/lib/imports/cell-text'
import { fileOf } from './build-zip'

const headings = ['Address', '=Note', 'C2']
const rows: OutCell[][] = [
  ['4, Lantern Lane', '=HYPERLINK("http://example.invalid","click")', 2],
  ['7 Cooper’s Yard', '+44', -5],
  ['café', null, 0],
  ['@cmd', '\t=1', 1.5],
]
async function* streamed() {
  yield* rows
}

it.each([
  ['=1+1', "'=1+1"], ['+1', "'+1"], ['-1', "'-1"], ['@x', "'@x"], ['\tx', "'\tx"], ['\rx', "'\rx"], ['＝1', "'＝1"],
  ['plain', 'plain'], ['a=1', 'a=1'], ['', ''], [-5, -5], [null, null],
])('%j goes out as %j', (cell, out) => {
  expect(neutralCell(cell)).toBe(out)
}) // prettier-ignore

describe('a written file', () => {
  it('as CSV begins with a byte-order mark, quotes what it must, and runs nothing', async () => {
    const path = fileOf('')
    await writeCsv(headings, streamed(), createWriteStream(path))
    const text = readFileSync(path, 'utf8')
    expect(
      text.startsWith(
        '\uFEFFAddress,\'=Note,C2\r\n"4, Lantern Lane","\'=HYPERLINK(""http://example.invalid"",""click"")",2\r\n',
      ),
    ).toBe(true)
    expect(text).toContain("7 Cooper’s Yard,'+44,-5\r\n")
  })

  it.each([
    ['CSV', writeCsv],
    ['a workbook', writeXlsx],
  ])('as %s comes back as it was', async (kind, write) => {
    const path = fileOf('')
    await write(headings, streamed(), createWriteStream(path))
    const file = await openSheets(path)
    const back = await file.preview(0, 10)
    // Text loses the apostrophe again when an import reads it; numbers of a workbook are numbers.
    expect(back.map((row) => row.cells.map(cellText))[1]).toEqual([
      '4, Lantern Lane',
      '=HYPERLINK("http://example.invalid","click")',
      '2',
    ])
    expect(back[2]?.cells).toEqual(['7 Cooper’s Yard', "'+44", kind === 'CSV' ? '-5' : -5])
    expect(back).toHaveLength(5)
  })

  it('fails as its rows fail', async () => {
    async function* broken(): AsyncGenerator<OutCell[]> {
      yield ['1 Ropewalk']
      throw new Error('the database went away')
    }
    await expect(writeCsv(['Address'], broken(), createWriteStream(fileOf('')))).rejects.toThrow('went away')
    await expect(writeXlsx(['Address'], broken(), createWriteStream(fileOf('')))).rejects.toThrow('went away')
  })
})
