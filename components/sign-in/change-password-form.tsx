import { Form } from '@/components/ui/form'
import { PageHeader } from '@/components/ui/page-header'
import { SubmitButton } from '@/components/ui/submit-button'
import { type FormAction } from '@/lib/forms/form-state'
import { PasswordField } from './password-field'

/** Changes one's own password. */
export function ChangePasswordForm({ email, onChange }: { email: string; onChange: FormAction }) {
  return (
    <>
      <PageHeader
        title="Change your password"
        sub="You stay signed in here, and are signed out everywhere else."
      />
      <Form action={onChange} className="mt-4">
        <input type="email" autoComplete="username" value={email} readOnly hidden />
        <PasswordField name="currentPassword" label="Current password" />
        <PasswordField label="New password" isNew />
        <SubmitButton pendingText="Changing…">Change password</SubmitButton>
      </Form>
    </>
  )
}
