import { beforeAll, describe, expect, it } from 'vitest'
import { pool } from '@/db/knex'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { demoSignIns, type Seeded, seedDemo } from '@/lib/use-cases/demo/seed-demo'

const TODAY = calendarDay('2026-12-01')
const count = async (table: string) =>
  Number(((await pool()(table).count({ rows: '*' }).first()) as { rows: number }).rows)
const tally = async (column: string) => {
  const rows = (await pool()('home_register')
    .groupBy(column)
    .select({ value: column })
    .count({ homes: '*' })) as {
    value: string
    homes: number
  }[]
  return Object.fromEntries(rows.map(({ value, homes }) => [value, Number(homes)]))
}

describe('seeding the demo', () => {
  let seeded: Seeded[]
  beforeAll(async () => {
    seeded = await seedDemo(TODAY)
  }, 120_000)

  it('makes both organisations, and every home has its row and its score', async () => {
    expect(seeded.map(({ organisation }) => organisation)).toEqual(['Larrowside Homes', 'Tai Aberllinos'])
    const homes = seeded.reduce((sum, one) => sum + one.homes, 0)
    expect(homes).toBeGreaterThan(2_300)
    expect(await count('homes')).toBe(homes)
    expect(await count('home_register')).toBe(homes)
    expect(
      Number(((await pool()('home_register').min({ least: 'score' }).first()) as { least: number }).least),
    ).toBeGreaterThan(0)
    expect(await count('people')).toBe(demoSignIns().length)
  })

  it('has something true for every screen: each board, each cover, each kind of record, open defects of each code', async () => {
    expect(Object.keys(await tally('board_type')).sort()).toEqual([
      'breakers',
      'cartridge',
      'mixed',
      'rcbo',
      'rewireable',
      'unknown',
    ])
    expect(Object.keys(await tally('rcd_cover')).sort()).toEqual([
      'all',
      'none',
      'part',
      'sockets',
      'unknown',
    ])
    expect(Object.keys(await tally('inspection_record')).sort()).toEqual(['dated', 'never', 'unknown'])
    const codes = (await pool()('defects').whereNull('closed_on').groupBy('code').select('code')) as {
      code: string
    }[]
    expect(codes.map(({ code }) => code).sort()).toEqual(['C1', 'C2', 'C3', 'FI'])
    expect(await count('inspections')).toBeGreaterThan(1_500)
  })

  it('keeps the history of facts, and one current fact of a kind', async () => {
    const past = (await pool()('home_facts').whereNull('is_current').count({ rows: '*' }).first()) as {
      rows: number
    }
    expect(Number(past.rows)).toBeGreaterThan(300)
  })

  it('gives one officer one patch', async () => {
    const rows = (await pool()('membership_patches as given')
      .join('people as person', 'person.id', 'given.person_id')
      .join('patches as patch', 'patch.id', 'given.patch_id')
      .select('person.email', 'patch.name')) as { email: string; name: string }[]
    expect(rows.map((row) => ({ ...row }))).toEqual([
      { email: 'officer@larrowside.example', name: 'Netherfold' },
    ])
  })

  it('changes nothing the second time', async () => {
    const before = [await count('homes'), await count('home_facts'), await count('audit_entries')]
    expect(await seedDemo(TODAY)).toEqual([])
    expect([await count('homes'), await count('home_facts'), await count('audit_entries')]).toEqual(before)
  })
})
