'use client'
import Link from 'next/link'
import { Form } from '@/components/ui/form'
import { PageHeader } from '@/components/ui/page-header'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'
import { CheckYourMail } from './check-your-mail'

/** Asks for a link to choose a new password. */
export function ForgottenPasswordForm({ onAsk, inbox }: { onAsk: FormAction; inbox: string | null }) {
  return (
    <Form action={onAsk} quietWhenDone>
      {(state) =>
        state.status === 'done' ? (
          <CheckYourMail email={(state.result as { email: string }).email} inbox={inbox}>
            If that address has an account, the letter holds a link to choose a new password. It works once,
            within an hour.
          </CheckYourMail>
        ) : (
          <>
            <PageHeader
              title="Forgotten password"
              sub="We send a link to your address with which you choose a new one."
            />
            <TextField
              name="email"
              type="email"
              label="E-mail address"
              autoComplete="username"
              inputMode="email"
              spellCheck={false}
            />
            <SubmitButton pendingText="Sending…">Send the link</SubmitButton>
            <p className="mt-8 border-t border-line pt-5">
              <Link href="/sign-in" className="link-block link">
                Back to sign in
              </Link>
            </p>
          </>
        )
      }
    </Form>
  )
}
