import { Form } from '@/components/ui/form'
import { PageHeader } from '@/components/ui/page-header'
import { SubmitButton } from '@/components/ui/submit-button'
import { type FormAction } from '@/lib/forms/form-state'
import { PasswordField } from './password-field'

type Props = { onChoose: FormAction; token: string; email: string; isFirst: boolean }

/** Behind the link of a letter: the first password, or a new one. */
export function ChoosePasswordForm({ onChoose, token, email, isFirst }: Props) {
  return (
    <>
      <PageHeader
        title={isFirst ? 'Choose your password' : 'Choose a new password'}
        sub={isFirst ? undefined : 'You are signed out everywhere else, and in here.'}
      />
      <Form action={onChoose}>
        <p className="mb-6">
          For <strong className="break-words">{email}</strong>
        </p>
        <input type="hidden" name="token" value={token} />
        {/* so that a password manager keeps the two together */}
        <input type="email" autoComplete="username" value={email} readOnly hidden />
        <PasswordField label={isFirst ? 'Password' : 'New password'} isNew />
        <SubmitButton pendingText="Signing in…">
          {isFirst ? 'Keep it and go in' : 'Change it and go in'}
        </SubmitButton>
      </Form>
    </>
  )
}
