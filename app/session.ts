/**
 * From cookie to actor: the one reader of the session cookie. The cookie is next-auth's own encrypted token and holds
 * the id of a session row, nothing else; who that is, for which organisation, in which role and over which patches is
 * read from the database on every request, so that ending a session or an access acts at once.
 */
import 'server-only'
import { decode, encode } from 'next-auth/jwt'
import { cookies, headers } from 'next/headers'
import { redirect } from 'next/navigation'
import { cache } from 'react'
import { type Actor } from '@/lib/access/actor'
import { env } from '@/lib/platform/env'
import { endSession } from '@/lib/use-cases/people/end-session'
import { readActor } from '@/lib/use-cases/people/read-actor'
import { SESSION_DAYS } from '@/lib/use-cases/people/session-life'

const MAX_AGE = SESSION_DAYS * 24 * 60 * 60 // [s]

const secure = () => env().NEXTAUTH_URL.startsWith('https:')
const cookieName = () => `${secure() ? '__Secure-' : ''}next-auth.session-token`

/** The id of the session row that the cookie names; null where there is none or the cookie is not ours. */
export async function currentSessionId(): Promise<string | null> {
  const token = (await cookies()).get(cookieName())?.value
  if (!token) return null
  const content = await decode({ token, secret: env().NEXTAUTH_SECRET }).catch(() => null)
  return typeof content?.session === 'string' ? content.session : null
}

/** Who is signed in, or null. Read from the database once a request. */
export const optionalActor = cache(async (): Promise<Actor | null> => {
  const sessionId = await currentSessionId()
  return sessionId ? readActor(sessionId) : null
})

/** Who is signed in; where nobody is, the sign-in page, and from there back to here. */
export async function requireActor(): Promise<Actor> {
  const actor = await optionalActor()
  if (actor) return actor
  const here = (await headers()).get('x-here')
  redirect(here && here !== '/' ? `/sign-in?next=${encodeURIComponent(here)}` : '/sign-in')
}

/** Puts the cookie of a fresh session row; the session that was there before ends. */
export async function openSession(sessionId: string): Promise<void> {
  const before = await currentSessionId()
  if (before && before !== sessionId) await endSession(before)
  const value = await encode({
    token: { session: sessionId },
    secret: env().NEXTAUTH_SECRET,
    maxAge: MAX_AGE,
  })
  const options = { httpOnly: true, sameSite: 'lax', path: '/', secure: secure(), maxAge: MAX_AGE } as const
  ;(await cookies()).set(cookieName(), value, options)
}

/** Ends the session row and takes the cookie away. */
export async function closeSession(): Promise<void> {
  const sessionId = await currentSessionId()
  if (sessionId) await endSession(sessionId)
  ;(await cookies()).delete({
    name: cookieName(),
    path: '/',
    secure: secure(),
    httpOnly: true,
    sameSite: 'lax',
  })
}
