/** A whole stock list into a real register, from the command line's own use-case. */
import { readFileSync } from 'node:fs'
import { beforeAll, describe, expect, it } from 'vitest'
import { reading } from '@/db/connection'
import * as organisations from '@/db/repositories/organisations'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { homeQueryOf } from '@/lib/homes/home-query'
import { listHomes } from '@/lib/use-cases/homes/list-homes'
import { countRewireableByPatch } from '@/lib/use-cases/homes/count-rewireable'
import { importFromFile } from '@/lib/use-cases/imports/import-from-file'
import { type AnOrganisation, anOrganisation } from '@/tests/builders/an-organisation'

const STOCK = 'tests/fixtures/quillhaven-stock.xlsx'
const expected = JSON.parse(readFileSync('tests/fixtures/quillhaven-stock.expected.json', 'utf8')) as {
  accepted: number
  data_rows: number
  board: Record<string, number>
  rewireable_by_patch: Record<string, number>
}
const today = calendarDay('2026-12-01')

let provider: AnOrganisation
let slug: string
const run = (dryRun: boolean, path = STOCK) => importFromFile({ path, organisation: slug, today, dryRun })
const homesNow = async () => (await listHomes(provider.manager, homeQueryOf({}), today)).all

beforeAll(async () => {
  provider = await anOrganisation()
  slug = (await organisations.get(reading(provider.manager))).slug
})

describe('importing a stock list from a file', () => {
  it('changes nothing on a dry run', async () => {
    const { report, importId } = await run(true)
    expect(report.homes).toEqual({ added: expected.accepted, changed: 0, unchanged: 0 })
    expect(importId).toBeNull()
    expect(await homesNow()).toBe(0)
  })

  it('takes in what the independent count of the file says', async () => {
    const { report } = await run(false)
    expect(report.homes.added).toBe(expected.accepted)
    expect(report.tally.data_rows).toBe(expected.data_rows)
    expect(await homesNow()).toBe(expected.accepted)
    const { patches, totals } = await countRewireableByPatch(provider.manager, today)
    const counted = Object.fromEntries(
      patches.flatMap(({ patch, withRewireableWays }) =>
        patch && withRewireableWays ? [[patch.name, withRewireableWays]] : [],
      ),
    )
    expect(counted).toEqual(expected.rewireable_by_patch)
    expect(totals.unknown).toBe(expected.board.unknown)
  })

  it('changes nothing the second time', async () => {
    const { report } = await run(false)
    expect(report.homes).toEqual({ added: 0, changed: 0, unchanged: expected.accepted })
    expect(report.kept).toEqual({})
    expect(await homesNow()).toBe(expected.accepted)
  })

  it('takes a small landlord’s list with hardly any columns', async () => {
    const landlord = await anOrganisation({ name: 'Three Homes', kind: 'landlord' })
    const { slug: own } = await organisations.get(reading(landlord.manager))
    const { report } = await importFromFile({
      path: 'tests/fixtures/three-homes.csv',
      organisation: own,
      today,
      dryRun: false,
    })
    expect(report.homes.added).toBe(3)
    const { rows } = await listHomes(landlord.manager, homeQueryOf({ sort: 'address', order: 'asc' }), today)
    expect(rows.map(({ boardType }) => boardType).sort()).toEqual(['breakers', 'rewireable', 'unknown'])
  })

  it('knows no organisation by a wrong name', async () => {
    await expect(
      importFromFile({ path: STOCK, organisation: 'nobody', today, dryRun: true }),
    ).rejects.toThrow('nobody')
  })
})
