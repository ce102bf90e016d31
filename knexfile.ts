/** For the Knex command: `node --import tsx node_modules/knex/bin/cli.js migrate:status`. */
import { type Knex } from 'knex'
import { migrationSource } from '@/db/migrations/source'
import { env } from '@/lib/platform/env'

const config: Knex.Config = {
  client: 'mysql2',
  connection: env().DATABASE_URL_MIGRATE,
  migrations: { migrationSource },
}

export default config
