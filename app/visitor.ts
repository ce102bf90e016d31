/** What is known of somebody who is not signed in: the address they come from and the device's own cookie. */
import 'server-only'
import { cookies, headers } from 'next/headers'
import { env } from '@/lib/platform/env'
import { type Visitor } from '@/lib/use-cases/people/visitor'

const secure = () => env().NEXTAUTH_URL.startsWith('https:')
const cookieName = () => `${secure() ? '__Host-' : ''}fuseward-device`
const MAX_AGE = 180 * 24 * 60 * 60 // [s]

/**
 * The visitor of this request. The last entry of x-forwarded-for is the one that the proxy in front (or the server
 * itself) wrote; whatever stands before it, the visitor may have made up.
 */
export async function visitor(): Promise<Visitor> {
  const forwarded = (await headers()).get('x-forwarded-for')
  return {
    ip: forwarded?.split(',').at(-1)?.trim() || 'unknown',
    device: (await cookies()).get(cookieName())?.value ?? null,
  }
}

/** Keeps the device's cookie: the browser of somebody who has signed in here before. */
export async function rememberDevice(device: string): Promise<void> {
  const options = { httpOnly: true, sameSite: 'lax', path: '/', secure: secure(), maxAge: MAX_AGE } as const
  ;(await cookies()).set(cookieName(), device, options)
}
