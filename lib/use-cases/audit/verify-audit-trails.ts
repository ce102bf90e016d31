import { deployment, reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'

export type TrailVerdict = { organisationId: string; entries: number; broken: audit.ChainBreak | null }

/** Walks the hash chain of every organisation. For the operator; it shows no content. */
export async function verifyAuditTrails(): Promise<TrailVerdict[]> {
  const verdicts: TrailVerdict[] = []
  for (const organisationId of await audit.chainedOrganisations(deployment()))
    verdicts.push({ organisationId, ...(await audit.verify(reading({ organisationId }))) })
  return verdicts
}
