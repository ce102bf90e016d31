import { NotAllowed, NotFound } from '@/lib/errors/expected'
import { type Actor } from './actor'
import { type Permission, PERMISSIONS } from './permission'

/** A thing that lies in a patch, or in none. */
export type InPatch = { readonly patchId: string | null }

/** Whether the actor's role carries the permission. */
export function can(actor: Actor, permission: Permission): boolean {
  return (PERMISSIONS[permission][1] as readonly string[]).includes(actor.role)
}

/** Whether a thing lies within the actor's patches. A home in no patch is seen only by those who see all. */
export function reaches(actor: Actor, thing: InPatch): boolean {
  return actor.patches === 'all' || (thing.patchId !== null && actor.patches.includes(thing.patchId))
}

/**
 * Refuses unless the actor may.
 * @throws NotFound where the thing lies outside the actor's patches, NotAllowed where the role does not carry it
 */
export function demand(actor: Actor, permission: Permission, thing?: InPatch): void {
  if (!can(actor, permission)) throw new NotAllowed()
  if (thing && !reaches(actor, thing)) throw new NotFound('That home')
}
