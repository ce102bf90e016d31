import { type Metadata } from 'next'
import { ChoosePasswordForm } from '@/components/sign-in/choose-password-form'
import { EndedLink } from '@/components/sign-in/ended-link'
import { showReset } from '@/lib/use-cases/people/show-reset'
import { choosePassword } from './actions'

export const metadata: Metadata = { title: 'Choose a password', referrer: 'no-referrer', robots: 'noindex' }

type Props = { params: Promise<{ token: string }> }

export default async function ResetPasswordPage({ params }: Props) {
  const { token } = await params
  const reset = await showReset(token)
  if (!reset) return <EndedLink kind="reset" />
  return <ChoosePasswordForm onChoose={choosePassword} token={token} {...reset} />
}
