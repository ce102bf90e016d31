/** Organisations: the landlords and housing providers that a deployment carries. */
import { type DeploymentScope, type Scope, type WritingScope } from '@/db/connection'
import { isDuplicate } from '@/db/duplicate'
import { NotFound } from '@/lib/errors/expected'
import { type Nation } from '@/lib/homes/nation'
import { type Organisation } from '@/lib/organisations/organisation'

type Row = {
  id: string
  slug: string
  name: string
  kind: 'provider' | 'landlord'
  nation: Nation
  notice_days: number
}

const toOrganisation = ({ notice_days, ...row }: Row): Organisation => ({ ...row, noticeDays: notice_days })
const COLUMNS = ['id', 'slug', 'name', 'kind', 'nation', 'notice_days'] as const

/** The scope's own organisation. */
export async function get(scope: Scope): Promise<Organisation> {
  const row = (await scope
    .db('organisations')
    .where({ id: scope.organisationId })
    .first(...COLUMNS)) as Row | undefined
  if (!row) throw new NotFound('That organisation')
  return toOrganisation(row)
}

/** An organisation by its slug, or null: for commands of the operator. */
export async function findBySlug(scope: DeploymentScope, slug: string): Promise<Organisation | null> {
  const row = (await scope
    .db('organisations')
    .where({ slug })
    .first(...COLUMNS)) as Row | undefined
  return row ? toOrganisation(row) : null
}

/** Adds an organisation under its slug, or under the slug with the next free number. */
export async function insert(
  scope: WritingScope,
  organisation: Omit<Organisation, 'id' | 'noticeDays'>,
): Promise<void> {
  const { name, kind, nation } = organisation
  for (let next = 1; ; next += 1) {
    const slug = next === 1 ? organisation.slug : `${organisation.slug}-${next}`
    try {
      await scope.db('organisations').insert({ id: scope.organisationId, slug, name, kind, nation })
      return
    } catch (thrown) {
      if (!isDuplicate(thrown)) throw thrown
    }
  }
}

/** Changes what an organisation may change of itself. */
export async function update(
  scope: WritingScope,
  changes: { name: string; nation: Nation; noticeDays: number },
): Promise<void> {
  await scope
    .db('organisations')
    .where({ id: scope.organisationId })
    .update({ name: changes.name, nation: changes.nation, notice_days: changes.noticeDays })
}

/** Holds the organisation's row, so that what follows happens one after another within it. */
export async function lock(scope: WritingScope): Promise<void> {
  await scope.db('organisations').where({ id: scope.organisationId }).forUpdate().first('id')
}

/** Asks the database for a sign of life. */
export async function ping(scope: DeploymentScope): Promise<void> {
  await scope.db.raw('select 1')
}
