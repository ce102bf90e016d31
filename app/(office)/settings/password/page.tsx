import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { ChangePasswordForm } from '@/components/sign-in/change-password-form'
import { change } from './actions'

export const metadata: Metadata = { title: 'Change password' }

/** For everybody who is signed in, whatever their role. */
export default async function PasswordPage() {
  const { email } = await requireActor()
  return <ChangePasswordForm email={email} onChange={change} />
}
