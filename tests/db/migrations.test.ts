import { type Knex } from 'knex'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openPool } from '@/db/knex'
import { migrationSource } from '@/db/migrations/source'
import { env } from '@/lib/platform/env'

let owner: Knex

beforeAll(() => {
  owner = openPool(env().DATABASE_URL_MIGRATE ?? '', 1)
})
afterAll(() => owner.destroy())

const OUR_OWN = "table_schema = database() and table_name not like 'knex%'"

async function rows<Row>(sql: string): Promise<Row[]> {
  const [found] = (await owner.raw(sql)) as [Row[], unknown]
  return found
}

/** Every column with what it holds, how it is indexed, and what it refers to: two equal answers are one schema. */
const schema = async () => ({
  columns: await rows(
    `select table_name, column_name, column_type, is_nullable, column_default, collation_name
      from information_schema.columns where ${OUR_OWN} order by 1, ordinal_position`,
  ),
  keys: await rows(
    `select table_name, index_name, non_unique, seq_in_index, column_name
      from information_schema.statistics where ${OUR_OWN} order by 1, 2, 4`,
  ),
  references: await rows(
    `select table_name, constraint_name, column_name, referenced_table_name, referenced_column_name
      from information_schema.key_column_usage where ${OUR_OWN} and referenced_table_name is not null order by 1, 2, ordinal_position`,
  ),
})

describe('the migrations', () => {
  it('go up, all the way down, and up again to the same schema', async () => {
    const before = await schema()
    expect(before.columns.length).toBeGreaterThan(100)

    await owner.migrate.rollback({ migrationSource }, true)
    expect((await schema()).columns).toEqual([])

    await owner.migrate.latest({ migrationSource })
    expect(await schema()).toEqual(before)
  })

  it('have names that sort in the order they run', async () => {
    const names = (await migrationSource.getMigrations([])).map((one) => one.name)
    expect(names).toEqual([...names].sort())
  })
})

describe('every table', () => {
  it('has a primary key, which replication needs', async () => {
    const without = await rows<{ name: string }>(
      `select t.table_name as name from information_schema.tables t
        left join information_schema.statistics s
          on s.table_schema = t.table_schema and s.table_name = t.table_name and s.index_name = 'PRIMARY'
        where t.table_schema = database() and t.table_name not like 'knex%' and s.index_name is null`,
    )
    expect(without).toEqual([])
  })

  it('that belongs to an organisation names it first in its primary key', async () => {
    const first = await rows<{ name: string; leads: string }>(
      `select c.table_name as name, s.column_name as leads from information_schema.columns c
        join information_schema.statistics s
          on s.table_schema = c.table_schema and s.table_name = c.table_name and s.index_name = 'PRIMARY' and s.seq_in_index = 1
        where c.table_schema = database() and c.column_name = 'organisation_id'`,
    )
    // a session is a person's, and is looked up before it is known for which organisation it speaks
    const belonging = first.filter(({ name }) => name !== 'sessions')
    expect(belonging.length).toBeGreaterThan(15)
    expect(belonging.filter(({ leads }) => leads !== 'organisation_id')).toEqual([])
  })

  it('refers to another table of an organisation by a key that holds the organisation too', async () => {
    const references = await rows<{ name: string; target: string; columns: string }>(
      `select table_name as name, referenced_table_name as target,
          group_concat(column_name order by ordinal_position) as columns
        from information_schema.key_column_usage
        where table_schema = database() and referenced_table_name is not null group by table_name, constraint_name, target`,
    )
    const shared = ['people', 'organisations']
    const inside = references.filter(({ target }) => !shared.includes(target))
    expect(inside.length).toBeGreaterThan(8)
    expect(inside.filter(({ columns }) => !columns.startsWith('organisation_id,'))).toEqual([])
  })

  it('is InnoDB in utf8mb4 or ASCII', async () => {
    expect(
      await rows(
        `select table_name from information_schema.tables
          where table_schema = database() and (engine <> 'InnoDB' or table_collation not like 'utf8mb4%')`,
      ),
    ).toEqual([])
    expect(
      await rows(
        `select table_name, column_name from information_schema.columns
          where table_schema = database() and character_set_name not in ('utf8mb4', 'ascii')`,
      ),
    ).toEqual([])
  })
})

describe('the connection', () => {
  it('keeps Welsh, signs and emoji', async () => {
    const text = 'Tŷ Môn, 2½ Ω ≥ ✓ 🔌'
    expect(await rows(`select '${text}' as kept`)).toEqual([{ kept: text }])
  })

  it('is strict, groups fully, speaks UTC and keeps snapshots apart', async () => {
    const [session] = await rows<Record<string, string | number>>(
      'select @@sql_mode as mode, @@time_zone as zone, @@innodb_snapshot_isolation as apart, @@max_allowed_packet as packet',
    )
    expect(session).toMatchObject({ zone: '+00:00', apart: 1, packet: 64 * 1024 * 1024 })
    expect(String(session?.mode).split(',')).toEqual(
      expect.arrayContaining(['STRICT_TRANS_TABLES', 'ONLY_FULL_GROUP_BY']),
    )
  })
})
