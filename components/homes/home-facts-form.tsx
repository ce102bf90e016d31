'use client'
import { type ReactNode, useContext } from 'react'
import { ButtonLink } from '@/components/ui/button-link'
import { DateField } from '@/components/ui/date-field'
import { Form } from '@/components/ui/form'
import { FormContext } from '@/components/ui/form-context'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'
import { type FactKind } from '@/lib/homes/fact'
import { FactField, withFreshFacts } from './home-fact-field'
import { type FactHistoryShown } from './home-shown'

const PARTS: readonly { readonly id: string; readonly title: string; readonly kinds: readonly FactKind[] }[] =
  [
    { id: 'board', title: 'What is on the wall', kinds: ['ways', 'board-type', 'rcd-cover'] },
    { id: 'wiring', title: 'The wiring', kinds: ['wiring', 'rewired'] },
    { id: 'dwelling', title: 'The dwelling', kinds: ['dwelling-type', 'built', 'bedrooms'] },
    { id: 'inspected', title: 'If no report is on record', kinds: ['inspection-record'] },
  ]

/** Shows the fields what was typed, but for facts that nobody touched: these follow the register. */
function FreshFacts({ facts, children }: { facts: readonly FactHistoryShown[]; children: ReactNode }) {
  const form = useContext(FormContext)
  if (!form?.values) return children
  return <FormContext value={{ ...form, values: withFreshFacts(form.values, facts) }}>{children}</FormContext>
}

type Props = { homeId: string; facts: readonly FactHistoryShown[]; action: FormAction }

/** Corrects what the register knows of a home. Only what was changed is sent on; the rest stays as it is. */
export function HomeFactsForm({ homeId, facts, action }: Props) {
  return (
    <Form action={action} label="Facts">
      <input type="hidden" name="homeId" value={homeId} />
      <FreshFacts facts={facts}>
        {PARTS.map(({ id, title, kinds }) => (
          <section
            key={id}
            id={id}
            aria-labelledby={`${id}-title`}
            className="mb-8 border-t border-line pt-5"
          >
            <h2 id={`${id}-title`} className="mb-4 text-xl">
              {title}
            </h2>
            {kinds.map((kind) => {
              const fact = facts.find((one) => one.kind === kind)
              return fact && <FactField key={kind} fact={fact} />
            })}
          </section>
        ))}
      </FreshFacts>
      <section aria-labelledby="from-title" className="border-t border-line pt-5">
        <h2 id="from-title" className="mb-4 text-xl">
          Where this is from
        </h2>
        <DateField
          name="asOf"
          legend="When it was so"
          hint="The day on which somebody looked, or the date on the paper. Month and day may stay empty if they are not known; all empty means today."
          optional
        />
        <TextField
          name="note"
          label="How it is known"
          hint="A few words: “photograph by the gas engineer”, “certificate in the file”."
          optional
          maxLength={300}
        />
      </section>
      <div className="flex flex-wrap gap-3">
        <SubmitButton pendingText="Saving…">Save the facts</SubmitButton>
        <ButtonLink href={`/homes/${homeId}`} kind="quiet">
          Leave them as they are
        </ButtonLink>
      </div>
    </Form>
  )
}
