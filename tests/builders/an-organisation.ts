/** An organisation with two patches and one person in each role, straight into the database. */
import { inDeploymentTransaction } from '@/db/connection'
import { type Actor } from '@/lib/access/actor'
import { type Role } from '@/lib/access/role'
import { type Nation } from '@/lib/homes/nation'
import { newId } from '@/lib/platform/new-id'

export type AnOrganisation = {
  organisationId: string
  patches: { north: string; south: string }
  /** sees every home */
  manager: Actor
  /** answers for the north patch alone */
  officer: Actor
  auditor: Actor
  supervisor: Actor
  electrician: Actor
}

const NAMES: Record<Role, string> = {
  manager: 'Maren Oakshott',
  officer: 'Owen Thistlewood',
  auditor: 'Ada Quillfeather',
  supervisor: 'Sol Brackenbury',
  electrician: 'Elin Copperfield',
}

/** @example const { manager, officer, patches } = await anOrganisation({ nation: 'wales' }) */
export async function anOrganisation(
  given: { name?: string; nation?: Nation; kind?: 'provider' | 'landlord' } = {},
): Promise<AnOrganisation> {
  const organisationId = newId()
  const name = given.name ?? 'Harrowgate Homes'
  const patches = { north: newId(), south: newId() }

  const actor = (role: Role): Actor => ({
    personId: newId(),
    name: NAMES[role],
    email: `${role}.${organisationId}@harrowgate.example`,
    organisationId,
    organisationName: name,
    role,
    patches: role === 'officer' ? [patches.north] : 'all',
  })
  const people = {
    manager: actor('manager'),
    officer: actor('officer'),
    auditor: actor('auditor'),
    supervisor: actor('supervisor'),
    electrician: actor('electrician'),
  }

  await inDeploymentTransaction(async ({ db }) => {
    await db('organisations').insert({
      id: organisationId,
      slug: `o-${organisationId}`,
      name,
      kind: given.kind ?? 'provider',
      nation: given.nation ?? 'england',
    })
    await db('patches').insert([
      { organisation_id: organisationId, id: patches.north, name: 'North' },
      { organisation_id: organisationId, id: patches.south, name: 'South' },
    ])
    const everyone = Object.values(people)
    await db('people').insert(everyone.map((one) => ({ id: one.personId, email: one.email, name: one.name })))
    await db('memberships').insert(
      everyone.map((one) => ({
        organisation_id: organisationId,
        person_id: one.personId,
        role: one.role,
        sees_all_patches: one.patches === 'all',
      })),
    )
    await db('membership_patches').insert({
      organisation_id: organisationId,
      person_id: people.officer.personId,
      patch_id: patches.north,
    })
  })
  return { organisationId, patches, ...people }
}
