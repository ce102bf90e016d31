'use client'
import Link from 'next/link'
import { Form } from '@/components/ui/form'
import { PageHeader } from '@/components/ui/page-header'
import { SelectField } from '@/components/ui/select-field'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'
import { NATION_NAMES, NATIONS } from '@/lib/homes/nation'
import { CheckYourMail } from './check-your-mail'

const CHOICES = [
  { value: '', label: 'Choose' },
  ...NATIONS.map((value) => ({ value, label: NATION_NAMES[value] })),
]

/** Sign-up of a small landlord: four answers, then a letter with the link to choose a password. */
export function SignUpForm({ onSignUp, inbox }: { onSignUp: FormAction; inbox: string | null }) {
  return (
    <Form action={onSignUp} quietWhenDone>
      {(state) =>
        state.status === 'done' ? (
          <CheckYourMail email={(state.result as { email: string }).email} inbox={inbox}>
            It holds the link to choose your password. With that you are in, and can add your homes. The link
            works once, within a day.
          </CheckYourMail>
        ) : (
          <>
            <PageHeader
              title="Start a register"
              sub="For the homes you let, be it one or a thousand. You can ask others to join later."
            />
            <TextField name="name" label="Your name" autoComplete="name" />
            <TextField
              name="email"
              type="email"
              label="E-mail address"
              hint="We send a link there to choose your password."
              autoComplete="email"
              inputMode="email"
              spellCheck={false}
            />
            <TextField
              name="organisationName"
              label="The name you let as"
              hint="Your own name, or your business’s."
              autoComplete="organization"
            />
            <SelectField
              name="nation"
              label="Nation where your homes are"
              hint="The law on inspections differs. Where they are in several, choose the one with most; each home can have its own."
              choices={CHOICES}
              width="medium"
            />
            <SubmitButton pendingText="Starting…">Start a register</SubmitButton>
            <p className="mt-8 border-t border-line pt-5">
              <Link href="/sign-in" className="link-block link">
                I have an account: sign in
              </Link>
            </p>
          </>
        )
      }
    </Form>
  )
}
