import { deployment } from '@/db/connection'
import * as memberships from '@/db/repositories/memberships'
import { type Actor } from '@/lib/access/actor'
import { type OrganisationChoice } from '@/lib/organisations/organisation'

/** The organisations that somebody may work for now, the one they joined first first. */
export const listOrganisations = (actor: Actor): Promise<OrganisationChoice[]> =>
  memberships.listOfPerson(deployment(), actor.personId)
