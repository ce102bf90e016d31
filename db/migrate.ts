/** `npm run migrate`: the newest schema and the users' rights, at DATABASE_URL_MIGRATE. */
import { env } from '@/lib/platform/env'
import { migrateDatabase } from './migrate-database'

const { DATABASE_URL: app, DATABASE_URL_MIGRATE: migrate, DATABASE_URL_READ: read } = env()
if (!migrate)
  throw new Error('DATABASE_URL_MIGRATE is not set: migrating needs the user that may change the schema')

const ran = await migrateDatabase({ migrate, app, ...(read && { read }) })
console.log(
  ran.length > 0 ? `Migrated: ${ran.join(', ')}` : 'The schema is the newest; rights are as they should be',
)
