/** Invitations: a link sent to an address, stored as the hash of its token. */
import { type DeploymentScope, type Scope, type WritingScope } from '@/db/connection'
import { type Role } from '@/lib/access/role'
import { NotFound } from '@/lib/errors/expected'
import { type Invitation } from '@/lib/people/invitation'
import { newId } from '@/lib/platform/new-id'

type Row = {
  organisation_id: string
  id: string
  email: string
  role: Role
  patch_ids: string
  created_at: Date
  expires_at: Date
}

/** `patch_ids` holds the chosen patches; null means all of them. */
const toInvitation = (row: Row): Invitation => ({
  id: row.id,
  email: row.email,
  role: row.role,
  patches: (JSON.parse(row.patch_ids) as string[] | null) ?? 'all',
  sentAt: row.created_at.toISOString(),
  expiresAt: row.expires_at.toISOString(),
})

const unanswered = (scope: Scope) =>
  scope
    .db('invitations')
    .where({ organisation_id: scope.organisationId })
    .whereNull('accepted_at')
    .whereNull('withdrawn_at')
    .select('*')

/** Invitations that were neither taken up nor withdrawn, also those that ran out; newest first. */
export async function listUnanswered(scope: Scope): Promise<Invitation[]> {
  return ((await unanswered(scope).orderBy('id', 'desc')) as Row[]).map(toInvitation)
}

/** An unanswered invitation. @throws NotFound where there is none in this organisation */
export async function getUnanswered(scope: Scope, id: string): Promise<Invitation> {
  const row = ((await unanswered(scope).where({ id })) as Row[])[0]
  if (!row) throw new NotFound('That invitation')
  return toInvitation(row)
}

/** Whether an address has an unanswered invitation. */
export async function hasUnanswered(scope: Scope, email: string): Promise<boolean> {
  return ((await unanswered(scope).where({ email })) as Row[]).length > 0
}

type New = {
  email: string
  role: Role
  patches: 'all' | readonly string[]
  tokenHash: string
  invitedBy: string
  at: Date
  expiresAt: Date
}

/** Adds an invitation and gives its id. */
export async function insert(scope: WritingScope, given: New): Promise<string> {
  const id = newId()
  await scope.db('invitations').insert({
    organisation_id: scope.organisationId,
    id,
    email: given.email,
    role: given.role,
    patch_ids: JSON.stringify(given.patches === 'all' ? null : given.patches),
    token_hash: given.tokenHash,
    invited_by: given.invitedBy,
    created_at: given.at,
    expires_at: given.expiresAt,
  })
  return id
}

const openById = (scope: WritingScope, id: string) =>
  scope
    .db('invitations')
    .where({ organisation_id: scope.organisationId, id })
    .whereNull('accepted_at')
    .whereNull('withdrawn_at')

/** Gives an invitation a new token and a new end; the old link ends. False where it was answered meanwhile. */
export const renew = async (
  scope: WritingScope,
  id: string,
  tokenHash: string,
  expiresAt: Date,
): Promise<boolean> =>
  (await openById(scope, id).update({ token_hash: tokenHash, expires_at: expiresAt })) === 1

/** Withdraws an invitation. False where it was answered meanwhile. */
export const withdraw = async (scope: WritingScope, id: string, at: Date): Promise<boolean> =>
  (await openById(scope, id).update({ withdrawn_at: at })) === 1

/** Takes an invitation up, once. False where it was taken up, withdrawn or ran out meanwhile. */
export const accept = async (scope: WritingScope, id: string, at: Date): Promise<boolean> =>
  (await openById(scope, id).where('expires_at', '>', at).update({ accepted_at: at })) === 1

export type OpenInvitation = Invitation & {
  readonly organisationId: string
  readonly organisationName: string
}

/** The invitation that a link stands for, while it may be taken up; else null. */
export async function findByToken(
  scope: Pick<DeploymentScope, 'db'>,
  tokenHash: string,
  at: Date,
): Promise<OpenInvitation | null> {
  const row = (await scope
    .db('invitations as invitation')
    .join('organisations as organisation', 'organisation.id', 'invitation.organisation_id')
    .where('invitation.token_hash', tokenHash)
    .whereNull('invitation.accepted_at')
    .whereNull('invitation.withdrawn_at')
    .where('invitation.expires_at', '>', at)
    .first('invitation.*', { organisation_name: 'organisation.name' })) as
    (Row & { organisation_name: string }) | undefined
  if (!row) return null
  return {
    ...toInvitation(row),
    organisationId: row.organisation_id,
    organisationName: row.organisation_name,
  }
}
