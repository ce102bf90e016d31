/** Sessions: rows that a cookie names. They belong to a person and an organisation, and end on the server. */
import { type DeploymentScope } from '@/db/connection'
import { type Actor } from '@/lib/access/actor'
import { type Role } from '@/lib/access/role'
import { newId } from '@/lib/platform/new-id'
import { patchIdsOf } from './patch-ids-of'

type LiveRow = {
  created_at: Date
  expires_at: Date
  person_id: string
  person_name: string
  email: string
  organisation_id: string
  organisation_name: string
  role: Role
  sees_all_patches: number
  patch_ids: string | null
}

export type LiveSession = { readonly actor: Actor; readonly createdAt: Date; readonly expiresAt: Date }

/** The session and whom it stands for, in one statement; null where it ended, ran out, or the access behind it ended. */
export async function findLive(scope: DeploymentScope, id: string, at: Date): Promise<LiveSession | null> {
  const row = (await scope
    .db('sessions as session')
    .join('people as person', 'person.id', 'session.person_id')
    .join('organisations as organisation', 'organisation.id', 'session.organisation_id')
    .join('memberships as membership', (on) =>
      on
        .on('membership.organisation_id', 'session.organisation_id')
        .andOn('membership.person_id', 'session.person_id')
        .andOnNull('membership.ended_at'),
    )
    .where('session.id', id)
    .whereNull('session.ended_at')
    .where('session.expires_at', '>', at)
    .first({
      created_at: 'session.created_at',
      expires_at: 'session.expires_at',
      person_id: 'person.id',
      person_name: 'person.name',
      email: 'person.email',
      organisation_id: 'organisation.id',
      organisation_name: 'organisation.name',
      role: 'membership.role',
      sees_all_patches: 'membership.sees_all_patches',
      patch_ids: patchIdsOf(scope.db),
    })) as LiveRow | undefined
  if (!row) return null
  const actor: Actor = {
    personId: row.person_id,
    name: row.person_name,
    email: row.email,
    organisationId: row.organisation_id,
    organisationName: row.organisation_name,
    role: row.role,
    patches: row.sees_all_patches ? 'all' : (row.patch_ids?.split(',') ?? []),
  }
  return { actor, createdAt: row.created_at, expiresAt: row.expires_at }
}

/** When a session began that is still live, or null. */
export async function findBeginning(scope: DeploymentScope, id: string, at: Date): Promise<Date | null> {
  const row = await scope
    .db('sessions')
    .where({ id })
    .whereNull('ended_at')
    .where('expires_at', '>', at)
    .first('created_at')
  return (row as { created_at: Date } | undefined)?.created_at ?? null
}

/** The organisation that a person last worked for, by their sessions. */
export async function findLastOrganisation(scope: DeploymentScope, personId: string): Promise<string | null> {
  const row = await scope
    .db('sessions')
    .where({ person_id: personId })
    .orderBy('id', 'desc')
    .first('organisation_id')
  return (row as { organisation_id: string } | undefined)?.organisation_id ?? null
}

/** Begins a session and gives its id. */
export async function insert(
  scope: DeploymentScope,
  session: { personId: string; organisationId: string; createdAt: Date; expiresAt: Date },
): Promise<string> {
  const id = newId()
  await scope.db('sessions').insert({
    id,
    person_id: session.personId,
    organisation_id: session.organisationId,
    created_at: session.createdAt,
    expires_at: session.expiresAt,
  })
  return id
}

/** Moves a session's end, unless it has ended meanwhile. */
export async function extend(scope: DeploymentScope, id: string, expiresAt: Date): Promise<void> {
  await scope.db('sessions').where({ id }).whereNull('ended_at').update({ expires_at: expiresAt })
}

/** Ends one session. */
export async function end(scope: DeploymentScope, id: string, at: Date): Promise<void> {
  await scope.db('sessions').where({ id }).whereNull('ended_at').update({ ended_at: at })
}

/** Ends a person's sessions: in one organisation where one is given, all but one where one is to stay. */
export async function endAllOf(
  scope: Pick<DeploymentScope, 'db'>,
  personId: string,
  at: Date,
  only: { organisationId?: string; except?: string | null } = {},
): Promise<number> {
  const query = scope.db('sessions').where({ person_id: personId }).whereNull('ended_at')
  if (only.organisationId) query.where({ organisation_id: only.organisationId })
  if (only.except) query.whereNot({ id: only.except })
  return query.update({ ended_at: at })
}
