import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'

/** The work that an organisation has issued to a contractor's firm. No work can be issued yet, so there is none. */
export async function listVisits(actor: Actor): Promise<{ organisationName: string }> {
  demand(actor, 'visits.read')
  return { organisationName: actor.organisationName }
}
