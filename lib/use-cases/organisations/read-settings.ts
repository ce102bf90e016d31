import { reading } from '@/db/connection'
import * as organisations from '@/db/repositories/organisations'
import * as patches from '@/db/repositories/patches'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { type Organisation } from '@/lib/organisations/organisation'

export type ShownSettings = {
  readonly organisation: Organisation
  readonly patches: readonly patches.Patch[]
}

/** The organisation's settings and its patches. */
export async function readSettings(actor: Actor): Promise<ShownSettings> {
  demand(actor, 'organisation.read')
  const scope = reading(actor)
  return { organisation: await organisations.get(scope), patches: await patches.list(scope) }
}
