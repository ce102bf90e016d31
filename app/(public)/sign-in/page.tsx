import { type Metadata } from 'next'
import { redirect } from 'next/navigation'
import { optionalActor } from '@/app/session'
import { SignInForm } from '@/components/sign-in/sign-in-form'
import { landingPathOf } from '@/lib/access/landing-path-of'
import { safePath } from '@/lib/access/safe-path'
import { enter } from './actions'

export const metadata: Metadata = { title: 'Sign in' }

type Props = { searchParams: Promise<{ next?: string | string[] }> }

export default async function SignInPage({ searchParams }: Props) {
  const { next } = await searchParams
  const goingTo = safePath(typeof next === 'string' ? next : null)
  const actor = await optionalActor()
  if (actor) redirect(goingTo ?? landingPathOf(actor))
  return <SignInForm onSignIn={enter} next={goingTo} />
}
