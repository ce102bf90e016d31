'use client'
import { ButtonLink } from '@/components/ui/button-link'
import { RadioGroup } from '@/components/ui/choice-group'
import { DateField } from '@/components/ui/date-field'
import { Disclosure } from '@/components/ui/disclosure'
import { Form } from '@/components/ui/form'
import { type Choice, SelectField } from '@/components/ui/select-field'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'
import { RCD_COVER_NAMES, RCD_COVERS } from '@/lib/homes/rcd-cover'
import { BoardChoice } from './home-board-choice'
import { FACT_CHOICES } from './home-fact-choices'
import { AddressFields, DutyFields, FilingFields } from './home-identity-fields'

/** Fields that are folded away until one of them has a problem. */
const FILED = ['patch', 'block', 'reference', 'uprn']
const heading = 'mb-4 border-t border-line pt-5 text-xl'

/** Adds one home: where it is, what is on its wall, when it was inspected. "Not known" is an answer everywhere. */
export function HomeAddForm({ patches, action }: { patches: readonly Choice[]; action: FormAction }) {
  return (
    <Form action={action} label="New home">
      {({ problems }) => (
        <>
          <AddressFields />
          <DutyFields />
          <h2 className={heading}>The building</h2>
          <TextField
            name="built"
            label="Built"
            hint="A year, or a span: 1931, 1960/1969, ../1939 for up to. Leave it empty if it is not known."
            width="short"
            autoComplete="off"
            mono
            optional
          />
          <SelectField
            name="dwelling-type"
            label="Kind of dwelling"
            choices={FACT_CHOICES['dwelling-type']}
            defaultValue="unknown"
            width="medium"
          />
          <h2 className={heading}>The wiring</h2>
          <BoardChoice />
          <RadioGroup
            name="rcd-cover"
            legend="Is there an RCD?"
            hint="A device with a button marked T or Test, which cuts off when current leaks to earth."
            defaultValue="unknown"
            choices={RCD_COVERS.map((cover) => ({
              value: cover,
              label:
                cover === 'part'
                  ? 'For some circuits'
                  : cover === 'sockets'
                    ? 'For the sockets only'
                    : RCD_COVER_NAMES[cover],
            }))}
          />
          <h2 className={heading}>The last inspection</h2>
          <RadioGroup
            name="inspection-record"
            legend="Is there a report of an inspection?"
            hint="An electrical installation condition report, or the certificate of a new or rewired home."
            defaultValue="unknown"
            choices={[
              { value: 'reported', label: 'Yes', hint: 'Give its date below, as far as you know it.' },
              { value: 'never', label: 'No, it was never inspected' },
              { value: 'unknown', label: 'Not known' },
            ]}
          />
          <DateField
            name="inspectedOn"
            legend="Date of the inspection"
            hint="If the day or the month is not known, leave it empty."
            optional
          />
          <DateField name="nextDueOn" legend="Next inspection by, as the report says" optional />
          <Disclosure
            summary="Patch, block and numbers of your own"
            open={problems.some(({ field }) => FILED.includes(field))}
            className="mb-8 border-t border-line pt-5"
          >
            <FilingFields patches={patches} />
          </Disclosure>
          <div className="flex flex-wrap gap-3">
            <SubmitButton pendingText="Adding…">Add the home</SubmitButton>
            <ButtonLink href="/homes" kind="quiet">
              Back without adding
            </ButtonLink>
          </div>
        </>
      )}
    </Form>
  )
}
