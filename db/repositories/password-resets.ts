/** Password resets: a link sent to a person's address, stored as the hash of its token and used once. */
import { type DeploymentScope } from '@/db/connection'
import { newId } from '@/lib/platform/new-id'

type Anywhere = Pick<DeploymentScope, 'db'>

/** Adds a reset. */
export async function insert(
  scope: Anywhere,
  reset: { personId: string; tokenHash: string; at: Date; expiresAt: Date },
): Promise<void> {
  await scope.db('password_resets').insert({
    id: newId(),
    person_id: reset.personId,
    token_hash: reset.tokenHash,
    created_at: reset.at,
    expires_at: reset.expiresAt,
  })
}

/** Whose reset a link stands for, while it may be used; else null. */
export async function findPerson(scope: Anywhere, tokenHash: string, at: Date): Promise<string | null> {
  const row = await scope
    .db('password_resets')
    .where({ token_hash: tokenHash })
    .whereNull('used_at')
    .where('expires_at', '>', at)
    .first('person_id')
  return (row as { person_id: string } | undefined)?.person_id ?? null
}

/** Uses a reset, once. False where it was used or ran out meanwhile. */
export async function use(scope: Anywhere, tokenHash: string, at: Date): Promise<boolean> {
  const used = await scope
    .db('password_resets')
    .where({ token_hash: tokenHash })
    .whereNull('used_at')
    .where('expires_at', '>', at)
    .update({ used_at: at })
  return used === 1
}

/** Ends every other reset of a person. */
export async function endAllOf(scope: Anywhere, personId: string, at: Date): Promise<void> {
  await scope
    .db('password_resets')
    .where({ person_id: personId })
    .whereNull('used_at')
    .update({ used_at: at })
}
