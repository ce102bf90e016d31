/** Before each file of database tests: an empty, migrated database of this worker's own, and the settings to use it. */
import { afterAll, inject } from 'vitest'
import { closePool, openPool } from '@/db/knex'
import { migrateDatabase } from '@/db/migrate-database'

const { prefix, ...server } = inject('databases')
const database = `${prefix}${process.env.VITEST_POOL_ID ?? '0'}`

const at = (address: string) => Object.assign(new URL(address), { pathname: `/${database}` }).href

const addresses = { migrate: at(server.migrate), app: at(server.app), read: at(server.read) }

const owner = openPool(server.migrate, 1)
await owner.raw('set foreign_key_checks = 0') // else a table may not go before those that refer to it
await owner.raw('create or replace database ?? character set utf8mb4 collate utf8mb4_uca1400_ai_ci', [
  database,
])
await owner.destroy()
await migrateDatabase(addresses)

Object.assign(process.env, {
  DATABASE_URL: addresses.app,
  DATABASE_URL_MIGRATE: addresses.migrate,
  DATABASE_URL_READ: addresses.read,
  NEXTAUTH_URL: 'http://localhost:3000',
  NEXTAUTH_SECRET: 'for-tests-only-for-tests-only-for-tests-only',
  // nothing listens here: a test that sends or stores for real starts a fake and says so
  MAIL_URL: 'smtp://127.0.0.1:9',
  FILES_ENDPOINT: 'http://127.0.0.1:9',
  FILES_KEY: 'S3RVER',
  FILES_SECRET: 'S3RVER',
  FUSEWARD_DEPLOYMENT: 'demo',
  FUSEWARD_TODAY: '2026-12-01',
  LOG_LEVEL: 'silent',
})

afterAll(closePool)
