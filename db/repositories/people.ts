/** People: one row an e-mail address, whatever organisations they work for. */
import { type DeploymentScope } from '@/db/connection'
import { newId } from '@/lib/platform/new-id'

export type Person = {
  readonly id: string
  readonly email: string
  readonly name: string
  /** null until they choose a password through a link sent to their address */
  readonly passwordHash: string | null
}

type Anywhere = Pick<DeploymentScope, 'db'>
type Row = { id: string; email: string; name: string; password_hash: string | null }

const toPerson = ({ password_hash, ...row }: Row): Person => ({ ...row, passwordHash: password_hash })
const find = async (scope: Anywhere, where: Partial<Row>, hold = false): Promise<Person | null> => {
  const query = scope.db('people').where(where)
  if (hold) query.forUpdate()
  const row = (await query.first('id', 'email', 'name', 'password_hash')) as Row | undefined
  return row ? toPerson(row) : null
}

/** A person by their address, in lower case, or null. */
export const findByEmail = (scope: Anywhere, email: string): Promise<Person | null> => find(scope, { email })

/** A person by their id, or null. */
export const findById = (scope: Anywhere, id: string): Promise<Person | null> => find(scope, { id })

/** A person by their id, held until the transaction ends, or null. */
export const holdById = (scope: Anywhere, id: string): Promise<Person | null> => find(scope, { id }, true)

/** Adds a person and gives their id. */
export async function insert(
  scope: Anywhere,
  person: { email: string; name: string; passwordHash: string | null },
): Promise<string> {
  const id = newId()
  await scope
    .db('people')
    .insert({ id, email: person.email, name: person.name, password_hash: person.passwordHash })
  return id
}

/** Sets the password, and the name where one is given. */
export async function setPassword(
  scope: Anywhere,
  id: string,
  passwordHash: string,
  name?: string,
): Promise<void> {
  await scope
    .db('people')
    .where({ id })
    .update({ password_hash: passwordHash, ...(name === undefined ? {} : { name }) })
}
