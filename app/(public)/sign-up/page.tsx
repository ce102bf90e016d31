import { type Metadata } from 'next'
import { redirect } from 'next/navigation'
import { demoInbox } from '@/app/demo-inbox'
import { optionalActor } from '@/app/session'
import { SignUpForm } from '@/components/sign-in/sign-up-form'
import { landingPathOf } from '@/lib/access/landing-path-of'
import { begin } from './actions'

export const metadata: Metadata = { title: 'Start a register' }

export default async function SignUpPage() {
  const actor = await optionalActor()
  if (actor) redirect(landingPathOf(actor))
  return <SignUpForm onSignUp={begin} inbox={demoInbox()} />
}
