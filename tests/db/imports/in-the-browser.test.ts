/** The steps that a person takes in the browser, against real file storage with the S3 contract. */
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startFiles } from '@/fakes/files/start-files'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { homeQueryOf } from '@/lib/homes/home-query'
import { IMPORT_FIELDS } from '@/lib/imports/home-draft'
import { KNOWN_JOBS } from '@/lib/use-cases/jobs/known-jobs'
import { runNextJob } from '@/lib/use-cases/jobs/run-next-job'
import { listHomes } from '@/lib/use-cases/homes/list-homes'
import { cancelImport } from '@/lib/use-cases/imports/cancel-import'
import { changeLayout } from '@/lib/use-cases/imports/change-layout'
import { confirmImport } from '@/lib/use-cases/imports/confirm-import'
import { receiveFile } from '@/lib/use-cases/imports/receive-file'
import { rejectedRows } from '@/lib/use-cases/imports/rejected-rows'
import { showImport } from '@/lib/use-cases/imports/show-import'
import { startCheck } from '@/lib/use-cases/imports/start-check'
import { type AnOrganisation, anOrganisation } from '@/tests/builders/an-organisation'

const today = calendarDay('2026-12-01')
const folder = mkdtempSync(join(tmpdir(), 'fuseward imports '))
let files: Awaited<ReturnType<typeof startFiles>>
let own: AnOrganisation
let other: AnOrganisation

const stock = () => new Blob([new Uint8Array(readFileSync('tests/fixtures/quillhaven-stock.xlsx'))]).stream()
const text = (content: string) => new Blob([content]).stream()
const work = async () => {
  while (await runNextJob('test', KNOWN_JOBS)) continue
}
const shown = (importId: string, actor = own.manager) => showImport(actor, { importId, severity: 'rejected' })

/** The choice of columns as the form sends it. */
async function guessedColumns(importId: string) {
  const { layout } = (await shown(importId)).import
  return (layout?.headings ?? []).map(
    (_, column) => IMPORT_FIELDS.find((field) => layout?.mapping[field] === column) ?? '',
  )
}

beforeAll(async () => {
  files = await startFiles({ port: 0, folder: join(folder, 'files'), bucket: 'fuseward' })
  process.env.FILES_ENDPOINT = files.endpoint
  own = await anOrganisation()
  other = await anOrganisation({ name: 'Somebody Else' })
})
afterAll(async () => {
  await files.stop()
  rmSync(folder, { recursive: true })
})

describe('importing in the browser', () => {
  let id: string

  it('guesses sheet, header row and columns', async () => {
    id = (await receiveFile(own.manager, { name: 'C:\\lists\\stock 2026.xlsx', content: stock() }, today)).id
    const { import: found } = await shown(id)
    expect(found).toMatchObject({ fileName: 'stock 2026.xlsx', state: 'uploaded' })
    expect(found.layout).toMatchObject({
      headerRow: 4,
      mapping: { uprn: 1, 'board-type': 12, 'last-inspection': 16 },
    })
  })

  it('refuses a header row that is empty, and keeps what was chosen', async () => {
    const sheet = (await shown(id)).import.layout?.sheet ?? 0
    await expect(
      changeLayout(own.manager, { importId: id, sheet, headerRow: 59_999 }, today),
    ).rejects.toThrow('nothing in row')
    expect((await shown(id)).import.layout?.headerRow).toBe(4)
  })

  it('refuses columns without an address', async () => {
    const columns = (await guessedColumns(id)).map((field) =>
      field === 'street' || field === 'address' ? ('' as const) : field,
    )
    await expect(startCheck(own.manager, { importId: id, columns })).rejects.toThrow('address')
  })

  it('lists every problem and takes nothing in', async () => {
    await startCheck(own.manager, { importId: id, columns: await guessedColumns(id) })
    await work()
    const checked = await shown(id)
    expect(checked.import).toMatchObject({
      state: 'checked',
      report: { rejected: 10, homes: { added: 632 } },
    })
    expect(checked.problems.map(({ row, heading, why }) => `${row} ${heading}: ${why}`)).toContain(
      '213 C2: not a number',
    )
    expect((await listHomes(own.manager, homeQueryOf({}), today)).all).toBe(0)
  })

  it('gives the rejected rows back with the reason', async () => {
    const { headings, rows } = await rejectedRows(own.manager, { importId: id })
    const all = []
    for await (const row of rows) all.push(row)
    expect(headings.slice(-2)).toEqual(['Row in your file', 'Why it was not taken'])
    expect(all).toHaveLength(10)
    expect(all[0]?.slice(0, 2)).toEqual(['QH-1038', '100099000153'])
    expect(all[0]?.slice(-2)).toEqual([43, 'Last EICR: impossible date'])
  })

  it('is nothing to another organisation, and nothing to confirm for an auditor', async () => {
    await expect(shown(id, other.manager)).rejects.toThrow('was not found')
    await expect(confirmImport(other.manager, { importId: id })).rejects.toThrow('was not found')
    await expect(confirmImport(own.auditor, { importId: id })).rejects.toThrow('does not allow')
    await expect(shown(id, own.officer)).rejects.toThrow('does not allow')
  })

  it('takes the homes in once, however often it is confirmed', async () => {
    const answers = await Promise.allSettled(
      [1, 2, 3].map(() => confirmImport(own.manager, { importId: id })),
    )
    expect(answers.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    await work()
    expect((await shown(id)).import).toMatchObject({ state: 'done', report: { homes: { added: 632 } } })
    expect((await listHomes(own.manager, homeQueryOf({}), today)).all).toBe(632)
  })

  it('remembers the columns for the next file with the same headings', async () => {
    const again = await receiveFile(own.manager, { name: 'again.xlsx', content: stock() }, today)
    expect((await shown(again.id)).import.layout?.mapping).toEqual((await shown(id)).import.layout?.mapping)
    await cancelImport(own.manager, { importId: again.id })
    expect((await shown(again.id)).import.state).toBe('cancelled')
    await expect(confirmImport(own.manager, { importId: again.id })).rejects.toThrow('moved on')
  })

  it.each([
    ['an empty file', ''],
    ['a page of the web', '<!doctype html><html><body>hello</body></html>'],
    ['a PDF', '%PDF-1.7\n%âãÏÓ'],
  ])('refuses %s in plain words and keeps nothing', async (_what, content) => {
    const before = (await reading()).length
    await expect(
      receiveFile(own.manager, { name: 'x.csv', content: text(content) }, today),
    ).rejects.toMatchObject({ kind: 'invalid' })
    expect(await reading()).toHaveLength(before)
  })
})

async function reading() {
  const { listImports } = await import('@/lib/use-cases/imports/list-imports')
  return listImports(own.manager)
}
