import { reading } from '@/db/connection'
import * as invitations from '@/db/repositories/invitations'
import * as memberships from '@/db/repositories/memberships'
import * as patches from '@/db/repositories/patches'
import { type Actor } from '@/lib/access/actor'
import { can, demand } from '@/lib/access/can'
import { type Invitation } from '@/lib/people/invitation'
import { type Membership } from '@/lib/people/membership'
import { now } from '@/lib/platform/clock'

export type PersonRow = Membership & {
  readonly patchNames: readonly string[] | 'all'
  readonly isSelf: boolean
}
export type InvitationRow = Invitation & {
  readonly patchNames: readonly string[] | 'all'
  readonly hasRunOut: boolean
}

export type PeopleList = {
  readonly people: readonly PersonRow[]
  readonly invitations: readonly InvitationRow[]
  readonly patches: readonly patches.Patch[]
  readonly mayManage: boolean
}

/** Who has access to the organisation, who was asked to join, and the patches they can answer for. */
export async function listPeople(actor: Actor): Promise<PeopleList> {
  demand(actor, 'people.read')
  const scope = reading(actor)
  const all = await patches.list(scope)
  const names = new Map(all.map((patch) => [patch.id, patch.name]))
  const named = (ids: 'all' | readonly string[]) =>
    ids === 'all'
      ? 'all'
      : ids
          .map((id) => names.get(id) ?? '')
          .filter(Boolean)
          .sort()
  const at = now().toISOString()
  return {
    people: (await memberships.list(scope)).map((one) => ({
      ...one,
      patchNames: named(one.patches),
      isSelf: one.personId === actor.personId,
    })),
    invitations: (await invitations.listUnanswered(scope)).map((one) => ({
      ...one,
      patchNames: named(one.patches),
      hasRunOut: one.expiresAt <= at,
    })),
    patches: all,
    mayManage: can(actor, 'people.manage'),
  }
}
