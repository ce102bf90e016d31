import { type Knex } from 'knex'
import { peopleAndOrganisations } from './001-people-and-organisations'
import { register } from './002-register'
import { workAndProof } from './003-work-and-proof'
import { type Migration } from './migration'

/** Every migration in its order; Knex's own folder loader does not run under every test runner. */
const MIGRATIONS: readonly Migration[] = [peopleAndOrganisations, register, workAndProof]

const run = async (knex: Knex, statements: readonly string[]) => {
  for (const statement of statements) await knex.raw(statement)
}

export const migrationSource: Knex.MigrationSource<Migration> = {
  getMigrations: async () => [...MIGRATIONS],
  getMigrationName: (migration) => migration.name,
  getMigration: async (migration) => ({
    up: (knex) => run(knex, migration.up),
    down: (knex) => run(knex, migration.down),
    config: { transaction: false },
  }),
}
