import 'server-only'
import { redirect } from 'next/navigation'
import { landingPathOf } from '@/lib/access/landing-path-of'
import { safePath } from '@/lib/access/safe-path'
import { type LetIn } from '@/lib/use-cases/people/begin-session'
import { readActor } from '@/lib/use-cases/people/read-actor'
import { openSession } from './session'
import { rememberDevice } from './visitor'

/** Gives somebody their cookies, and takes them where they wanted to go, or to where their role begins. */
export async function letIn(entry: LetIn, next?: string): Promise<never> {
  await openSession(entry.sessionId)
  await rememberDevice(entry.device)
  const actor = await readActor(entry.sessionId)
  redirect(safePath(next) ?? (actor ? landingPathOf(actor) : '/sign-in'))
}
