/** What the application's users may do, table by table. Only the audit trail and the schema's own history differ. */
import { type Knex } from 'knex'

type Rights = readonly ('select' | 'insert' | 'update' | 'delete')[]

const EVERYTHING: Rights = ['select', 'insert', 'update', 'delete']

/** Entries of the audit trail are added and read, never changed: not by the application, whatever it is told. */
const NARROWER: Record<string, Rights> = {
  audit_entries: ['select', 'insert'],
  knex_migrations: ['select'],
  knex_migrations_lock: [],
}

/** "There is no such grant defined": nothing to take back. */
const NO_SUCH_GRANT = 1147

/** An account as MariaDB names it: `user@host`, as its own connection sees itself. */
export type Account = string

const quoted = (account: Account) => {
  const at = account.lastIndexOf('@')
  return [account.slice(0, at), account.slice(at + 1)]
    .map((part) => `'${part.replace(/['\\]/g, '\\$&')}'`)
    .join('@')
}

async function setRights(migrate: Knex, table: string, account: Account, rights: Rights): Promise<void> {
  const surplus = EVERYTHING.filter((right) => !rights.includes(right))
  if (rights.length > 0) await migrate.raw(`grant ${rights.join(', ')} on ?? to ${quoted(account)}`, [table])
  if (surplus.length === 0) return
  await migrate
    .raw(`revoke ${surplus.join(', ')} on ?? from ${quoted(account)}`, [table])
    .catch((thrown: unknown) => {
      if ((thrown as { errno?: number }).errno !== NO_SUCH_GRANT) throw thrown
    })
}

/** Gives the application's account and the reader's account their rights on every table there is. Repeatable. */
export async function grantRights(migrate: Knex, accounts: { app: Account; read?: Account }): Promise<void> {
  const [tables] = (await migrate.raw(
    `select table_name as name from information_schema.tables
      where table_schema = database() and table_type = 'BASE TABLE' order by table_name`,
  )) as [{ name: string }[], unknown]
  for (const { name } of tables) {
    await setRights(migrate, name, accounts.app, NARROWER[name] ?? EVERYTHING)
    if (accounts.read) await setRights(migrate, name, accounts.read, ['select'])
  }
}
