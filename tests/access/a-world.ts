/** Two organisations and things of the first: what the rows of the matrix are tried on. */
import { aHome } from '@/tests/builders/a-home'
import { anOrganisation } from '@/tests/builders/an-organisation'
import { inDeploymentTransaction } from '@/db/connection'
import * as invitations from '@/db/repositories/invitations'
import * as memberships from '@/db/repositories/memberships'
import * as people from '@/db/repositories/people'
import { type Actor } from '@/lib/access/actor'
import { newId } from '@/lib/platform/new-id'
import { freshInvitation } from '@/lib/use-cases/people/send-invitation'
import { type Somebody } from './everybody'

export type World = {
  actors: Readonly<Record<Exclude<Somebody, 'signed out'>, Actor>>
  patchId: string
  /** by the names that stand in paths */
  homeId: string
  defectId: string
  importId: string
  personId: string
  invitationId: string
  token: string
}

/** @example const world = await aWorld() */
export async function aWorld(): Promise<World> {
  const here = await anOrganisation({ name: 'Harrowgate Homes' })
  const elsewhere = await anOrganisation({ name: 'Second Housing' })
  const homeId = await aHome(here.manager, { patchId: here.patches.north })
  const importId = newId()
  const defectId = newId()
  const fresh = freshInvitation()
  const made = await inDeploymentTransaction(async (scope) => {
    const within = scope.within(here.organisationId)
    const join = async (name: string, role: 'officer' | 'auditor', patches: 'all' | readonly string[]) => {
      const email = `${newId()}@harrowgate.example`
      const personId = await people.insert(scope, { email, name, passwordHash: null })
      await memberships.grant(within, personId, { role, patches })
      return { personId, email, name, role, patches }
    }
    const south = await join('Sorrel Ashgrove', 'officer', [here.patches.south])
    const somebody = await join('Tamsin Yarrow', 'auditor', 'all')
    const invited = { email: `${newId()}@lets.example`, role: 'officer', patches: 'all' } as const
    const invitationId = await invitations.insert(within, {
      ...invited,
      ...fresh,
      invitedBy: here.manager.personId,
    })
    await scope.db('defects').insert({
      organisation_id: here.organisationId,
      home_id: homeId,
      id: defectId,
      code: 'C2',
      description: 'No main bonding to the gas pipe',
      source: 'officer',
    })
    await scope.db('imports').insert({
      organisation_id: here.organisationId,
      id: importId,
      file_name: 'stock.csv',
      file_key: `imports/${importId}`,
      file_size: 1,
      file_sha256: '0'.repeat(64),
      state: 'failed',
      failure: 'The file is empty.',
      started_by: here.manager.personId,
    })
    return { south, personId: somebody.personId, invitationId }
  })
  return {
    actors: {
      manager: here.manager,
      officer: here.officer,
      'officer of another patch': { ...here.officer, ...made.south },
      auditor: here.auditor,
      supervisor: here.supervisor,
      electrician: here.electrician,
      'manager elsewhere': elsewhere.manager,
    },
    ...{
      patchId: here.patches.north,
      homeId,
      defectId,
      importId,
      personId: made.personId,
      invitationId: made.invitationId,
      token: fresh.token,
    },
  }
}
