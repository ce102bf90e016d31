import { type Knex } from 'knex'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { anOrganisation } from '@/tests/builders/an-organisation'
import { openPool } from '@/db/knex'
import { migrateDatabase } from '@/db/migrate-database'
import { env } from '@/lib/platform/env'

/** MariaDB's own numbers for a refused right: on a table 1142, on a database 1044, on the whole server 1227. */
const REFUSED = expect.objectContaining({
  errno: expect.toSatisfy((errno: number) => [1142, 1044, 1227].includes(errno)),
})

let app: Knex
let read: Knex
let organisationId: string

beforeAll(async () => {
  app = openPool(env().DATABASE_URL, 1)
  read = openPool(env().DATABASE_URL_READ ?? '', 1)
  organisationId = (await anOrganisation()).organisationId
  await app('audit_entries').insert({
    organisation_id: organisationId,
    sequence: 1,
    at: new Date('2026-12-01T09:00:00Z'),
    did: 'test.began',
    subject_kind: 'organisation',
    subject_id: organisationId,
    detail: '{}',
    previous_hash: '0'.repeat(64),
    hash: '1'.repeat(64),
  })
})
afterAll(() => Promise.all([app.destroy(), read.destroy()]))

const asApp = (sql: string) => app.raw(sql).then(() => 'allowed')
const asRead = (sql: string) => read.raw(sql).then(() => 'allowed')

describe('the application’s user', () => {
  it('reads what it added to the audit trail', async () => {
    expect(await app('audit_entries').where({ organisation_id: organisationId }).pluck('did')).toEqual([
      'test.began',
    ])
  })

  it.each([
    ["update audit_entries set did = 'nothing'"],
    ['delete from audit_entries'],
    ['truncate table audit_entries'],
    ['drop table audit_entries'],
    ['replace into audit_entries select * from audit_entries'],
    ['create table somewhere (id int primary key)'],
    ['alter table homes add column more int'],
    ['drop table homes'],
    ['create trigger later before insert on homes for each row set new.note = null'],
    ["insert into knex_migrations (name, batch) values ('999', 9)"],
    ['update knex_migrations_lock set is_locked = 1'],
    ['select * from mysql.global_priv'],
    ["create user 'another'@'127.0.0.1'"],
    ['set global max_connections = 10'],
    ['grant update on audit_entries to current_user()'],
  ])('is refused: %s', async (sql) => {
    await expect(asApp(sql)).rejects.toEqual(REFUSED)
  })

  it('changes and removes rows of the other tables', async () => {
    expect(await asApp("update organisations set name = 'Another name' where name = 'nobody'")).toBe(
      'allowed',
    )
    expect(await asApp("delete from rate_limits where `key` = 'nobody'")).toBe('allowed')
  })
})

describe('the reader’s user', () => {
  it('reads', async () => {
    expect(await read('organisations').where({ id: organisationId }).pluck('name')).toEqual([
      'Harrowgate Homes',
    ])
  })

  it.each([
    ["update organisations set name = 'x'"],
    ['delete from homes'],
    ["insert into people (id, email, name) values (uuid(), 'a@b.example', 'A')"],
    ['create table somewhere (id int primary key)'],
    ['truncate table rate_limits'],
  ])('is refused: %s', async (sql) => {
    await expect(asRead(sql)).rejects.toEqual(REFUSED)
  })
})

describe('granting again', () => {
  it('runs no migration twice and takes back what is too much', async () => {
    const addresses = {
      migrate: env().DATABASE_URL_MIGRATE ?? '',
      app: env().DATABASE_URL,
      read: env().DATABASE_URL_READ ?? '',
    }
    const owner = openPool(addresses.migrate, 1)
    const [rows] = (await app.raw('select current_user() as account')) as [{ account: string }[], unknown]
    const account = (rows[0]?.account ?? '')
      .split('@')
      .map((part) => `'${part}'`)
      .join('@')
    await owner.raw(`grant update on audit_entries to ${account}`)
    await owner.destroy()
    expect(await asApp("update audit_entries set did = 'x' where sequence = 99")).toBe('allowed')

    expect(await migrateDatabase(addresses)).toEqual([])

    await expect(asApp("update audit_entries set did = 'x' where sequence = 99")).rejects.toEqual(REFUSED)
    expect(await app('audit_entries').where({ organisation_id: organisationId }).pluck('did')).toEqual([
      'test.began',
    ])
  })
})
