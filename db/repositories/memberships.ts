/** Memberships: who works for an organisation, in which role and over which patches. */
import { type DeploymentScope, type Scope, type WritingScope } from '@/db/connection'
import { type Role } from '@/lib/access/role'
import { NotFound } from '@/lib/errors/expected'
import { type Membership } from '@/lib/people/membership'
import { type OrganisationChoice } from '@/lib/organisations/organisation'
import { patchIdsOf } from './patch-ids-of'

type Row = {
  person_id: string
  name: string
  email: string
  role: Role
  sees_all_patches: number
  created_at: Date
  patch_ids: string | null
}

const live = (scope: Scope) => {
  return scope
    .db('memberships as membership')
    .join('people as person', 'person.id', 'membership.person_id')
    .where('membership.organisation_id', scope.organisationId)
    .whereNull('membership.ended_at')
    .select('membership.person_id', 'membership.role', 'membership.sees_all_patches', 'membership.created_at')
    .select('person.name', 'person.email', { patch_ids: patchIdsOf(scope.db) })
}

const toMembership = (row: Row): Membership => ({
  personId: row.person_id,
  name: row.name,
  email: row.email,
  role: row.role,
  patches: row.sees_all_patches ? 'all' : (row.patch_ids?.split(',') ?? []),
  since: row.created_at.toISOString(),
})

/** Everybody who has access, by name. */
export async function list(scope: Scope): Promise<Membership[]> {
  const rows = (await live(scope).orderBy(['person.name', 'person.id'])) as Row[]
  return rows.map(toMembership)
}

/** A person's live membership. @throws NotFound where they have none in this organisation */
export async function getByPerson(scope: Scope, personId: string): Promise<Membership> {
  const row = ((await live(scope).where('membership.person_id', personId)) as Row[])[0]
  if (!row) throw new NotFound('That person')
  return toMembership(row)
}

/** Whether an address has access to the organisation already. */
export async function hasEmail(scope: Scope, email: string): Promise<boolean> {
  return ((await live(scope).where('person.email', email)) as Row[]).length > 0
}

/** How many managers have access. */
export async function countManagers(scope: Scope): Promise<number> {
  const [row] = (await scope
    .db('memberships')
    .where({ organisation_id: scope.organisationId, role: 'manager' })
    .whereNull('ended_at')
    .count({ managers: '*' })) as { managers: number }[]
  return Number(row?.managers ?? 0)
}

/** Gives access, or gives it again where it had ended. */
export async function grant(
  scope: WritingScope,
  personId: string,
  given: { role: Role; patches: 'all' | readonly string[] },
): Promise<void> {
  const key = { organisation_id: scope.organisationId, person_id: personId }
  const row = { role: given.role, sees_all_patches: given.patches === 'all', ended_at: null }
  await scope
    .db('memberships')
    .insert({ ...key, ...row })
    .onConflict()
    .merge(row)
  await scope.db('membership_patches').where(key).del()
  if (given.patches === 'all' || given.patches.length === 0) return
  await scope.db('membership_patches').insert(given.patches.map((patch_id) => ({ ...key, patch_id })))
}

/** Ends access from now on. */
export async function end(scope: WritingScope, personId: string, at: Date): Promise<void> {
  await scope
    .db('memberships')
    .where({ organisation_id: scope.organisationId, person_id: personId })
    .whereNull('ended_at')
    .update({ ended_at: at })
}

/** The organisations that a person may work for now, the one they joined first first. */
export async function listOfPerson(
  scope: Pick<DeploymentScope, 'db'>,
  personId: string,
): Promise<OrganisationChoice[]> {
  return (await scope
    .db('memberships as membership')
    .join('organisations as organisation', 'organisation.id', 'membership.organisation_id')
    .where('membership.person_id', personId)
    .whereNull('membership.ended_at')
    .orderBy(['membership.created_at', 'organisation.id'])
    .select({ organisationId: 'organisation.id', name: 'organisation.name' })) as OrganisationChoice[]
}
