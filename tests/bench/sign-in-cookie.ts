import { encode } from 'next-auth/jwt'
import { deployment } from '@/db/connection'
import { type Actor } from '@/lib/access/actor'
import { env } from '@/lib/platform/env'
import { beginSession } from '@/lib/use-cases/people/begin-session'

/** The cookie of somebody who has just signed in. */
export async function signInCookie(actor: Actor): Promise<string> {
  const session = await beginSession(deployment(), actor.personId, actor.organisationId)
  const token = await encode({ token: { session }, secret: env().NEXTAUTH_SECRET, maxAge: 3600 })
  return `next-auth.session-token=${token}`
}
