/**
 * A messy stock list of an invented provider against a count that was made from the file independently of this program:
 * which rows are homes, which cannot be taken and why, and how many homes there are of each kind.
 */
import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { openSheets } from '@/lib/gateways/sheets/open-sheets'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { createRowReader } from '@/lib/imports/create-row-reader'
import { guessMapping } from '@/lib/imports/guess-mapping'
import { type HomeDraft } from '@/lib/imports/home-draft'
import { pickSheet } from '@/lib/imports/pick-sheet'
import { createTally } from '@/lib/imports/tally-outcomes'

const FILE = 'tests/fixtures/quillhaven-stock.xlsx'
const { note: _, ...expected } = JSON.parse(
  readFileSync('tests/fixtures/quillhaven-stock.expected.json', 'utf8'),
) as {
  note: string
  today: string
  sheet: string
}

/** The whole way from the file to the counts, with nothing told but the day. */
async function importQuillhaven() {
  const today = calendarDay(expected.today)
  const file = await openSheets(FILE)
  const previews = await Promise.all(
    file.sheets.map(async (sheet) => ({ ...sheet, rows: await file.preview(sheet.index, 100) })),
  )
  const picked = pickSheet(previews)
  if (!picked) throw new Error('No sheet was picked')
  const sample = previews[picked.index]?.rows ?? []
  const headings = sample.find((row) => row.number === picked.headerRow)?.cells ?? []
  const mapping = guessMapping(
    headings,
    sample.filter((row) => row.number > picked.headerRow),
    today,
  )
  const reader = createRowReader({ mapping, headings, today, nation: 'england' })
  const tally = createTally({ sheet: picked.name, headerRow: picked.headerRow, today, nation: 'england' })
  const drafts: HomeDraft[] = []
  for await (const row of file.rows(picked.index)) {
    if (row.number <= picked.headerRow) continue
    const outcome = reader.read(row)
    if (outcome.kind === 'accepted') drafts.push(outcome.draft)
    tally.add(outcome)
  }
  await file.close()
  return { mapping, tally: tally.result(), drafts }
}

describe('the Quillhaven stock list', async () => {
  const { mapping, tally, drafts } = await importQuillhaven()

  it('agrees with the independent count in every figure', () => {
    expect(tally).toMatchObject(expected)
    // toMatchObject lets counts of further kinds pass: these have none.
    for (const key of ['board', 'rcd', 'standing', 'rewireable_by_patch', 'rejected', 'warned'] as const)
      expect(tally[key]).toEqual((expected as unknown as typeof tally)[key])
  })

  it('has every column mapped from its heading alone', () => {
    expect(Object.keys(mapping)).toHaveLength(25)
    expect(Object.values(mapping).sort((one, other) => one - other)).toEqual(
      Array.from({ length: 25 }, (_, column) => column),
    )
  })

  it('sets the total aside, and nothing else', () => {
    expect(tally.set_aside).toEqual([{ row: 655, why: 'a total' }])
    expect(tally.noted).toEqual([])
  })

  it('keeps the formula in a note as text', () => {
    expect(
      drafts.filter((draft) => draft.note === '=HYPERLINK("http://example.invalid","click")').length,
    ).toBeGreaterThan(0)
  })

  it('places the homes off the coast, where no real home is', () => {
    const placed = drafts.filter((draft) => draft.latitude !== null)
    expect(placed).toHaveLength(606)
    for (const { latitude, longitude } of placed) {
      expect(latitude).toBeGreaterThan(53.1)
      expect(latitude).toBeLessThan(53.4)
      expect(longitude).toBeGreaterThan(0.6)
    }
  })
})
