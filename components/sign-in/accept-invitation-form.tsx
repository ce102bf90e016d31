import Link from 'next/link'
import { Form } from '@/components/ui/form'
import { PageHeader } from '@/components/ui/page-header'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type Role, ROLE_NAMES } from '@/lib/access/role'
import { type FormAction } from '@/lib/forms/form-state'
import { PasswordField } from './password-field'

type Props = {
  onAccept: FormAction
  token: string
  email: string
  role: Role
  organisationName: string
  hasPassword: boolean
}

/** Behind the link of an invitation: who asks, as what, and the password, new or one's own. */
export function AcceptInvitationForm({ onAccept, token, email, role, organisationName, hasPassword }: Props) {
  return (
    <>
      <PageHeader title={`Join ${organisationName}`} sub={`Role: ${ROLE_NAMES[role].toLowerCase()}`} />
      <Form action={onAccept}>
        <p className="mb-6">
          {hasPassword ? 'You have an account already: ' : 'Your account: '}
          <strong className="break-words">{email}</strong>
        </p>
        <input type="hidden" name="token" value={token} />
        {!hasPassword && <TextField name="name" label="Your name" autoComplete="name" />}
        <input type="email" autoComplete="username" value={email} readOnly hidden />
        <PasswordField label={hasPassword ? 'Your password' : 'Password'} isNew={!hasPassword} />
        <SubmitButton pendingText="Joining…">Join</SubmitButton>
      </Form>
      {hasPassword && (
        <p className="mt-8 border-t border-line pt-5">
          <Link href="/forgotten-password" className="link-block link">
            Forgotten password
          </Link>
        </p>
      )}
    </>
  )
}
