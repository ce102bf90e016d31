import { type Metadata } from 'next'
import { demoInbox } from '@/app/demo-inbox'
import { ForgottenPasswordForm } from '@/components/sign-in/forgotten-password-form'
import { ask } from './actions'

export const metadata: Metadata = { title: 'Forgotten password' }

export default function ForgottenPasswordPage() {
  return <ForgottenPasswordForm onAsk={ask} inbox={demoInbox()} />
}
