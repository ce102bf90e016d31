import Link from 'next/link'
import { Form } from '@/components/ui/form'
import { PageHeader } from '@/components/ui/page-header'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'

/** The sign-in page: address, password, and the ways on for those who have neither. */
export function SignInForm({ onSignIn, next }: { onSignIn: FormAction; next: string | null }) {
  return (
    <>
      <PageHeader title="Sign in" />
      <Form action={onSignIn}>
        {next && <input type="hidden" name="next" value={next} />}
        <TextField
          name="email"
          type="email"
          label="E-mail address"
          autoComplete="username"
          inputMode="email"
          spellCheck={false}
        />
        <TextField name="password" type="password" label="Password" autoComplete="current-password" />
        <SubmitButton pendingText="Signing in…">Sign in</SubmitButton>
      </Form>
      <ul className="mt-8 space-y-2 border-t border-line pt-5">
        <li>
          <Link href="/forgotten-password" className="link-block link">
            Forgotten password
          </Link>
        </li>
        <li>
          <Link href="/sign-up" className="link-block link">
            Start a register of your own
          </Link>
        </li>
      </ul>
    </>
  )
}
