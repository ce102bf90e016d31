import { type Metadata } from 'next'
import { AcceptInvitationForm } from '@/components/sign-in/accept-invitation-form'
import { EndedLink } from '@/components/sign-in/ended-link'
import { showInvitation } from '@/lib/use-cases/people/show-invitation'
import { accept } from './actions'

export const metadata: Metadata = {
  title: 'Take up an invitation',
  referrer: 'no-referrer',
  robots: 'noindex',
}

type Props = { params: Promise<{ token: string }> }

export default async function AcceptInvitationPage({ params }: Props) {
  const { token } = await params
  const invitation = await showInvitation(token)
  if (!invitation) return <EndedLink kind="invitation" />
  return <AcceptInvitationForm onAccept={accept} token={token} {...invitation} />
}
