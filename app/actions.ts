'use server'
import { redirect } from 'next/navigation'
import { landingPathOf } from '@/lib/access/landing-path-of'
import { isRefusal } from '@/lib/errors/expected'
import { readActor } from '@/lib/use-cases/people/read-actor'
import { switchOrganisation, SwitchOrganisation } from '@/lib/use-cases/people/switch-organisation'
import { closeSession, currentSessionId, openSession, optionalActor } from './session'

/** Ends the session on the server and goes to the sign-in page. */
export async function signOut(): Promise<void> {
  await closeSession()
  redirect('/sign-in')
}

/** Goes over to another organisation of the person who is signed in. */
export async function switchTo(form: FormData): Promise<void> {
  const actor = await optionalActor()
  const sessionId = await currentSessionId()
  if (!actor || !sessionId) redirect('/sign-in')
  const parsed = SwitchOrganisation.safeParse({ organisationId: form.get('organisationId') })
  if (!parsed.success) redirect(landingPathOf(actor))
  let next: string
  try {
    next = (await switchOrganisation(actor, { ...parsed.data, sessionId })).sessionId
  } catch (thrown) {
    if (!isRefusal(thrown)) throw thrown
    redirect(landingPathOf(actor)) // access ended between the menu and the choice: it goes from the menu
  }
  await openSession(next)
  const there = await readActor(next)
  redirect(there ? landingPathOf(there) : '/sign-in')
}
