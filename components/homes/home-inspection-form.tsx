'use client'
import { ButtonLink } from '@/components/ui/button-link'
import { RadioGroup } from '@/components/ui/choice-group'
import { DateField } from '@/components/ui/date-field'
import { Form } from '@/components/ui/form'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'
import { CLASSIFICATION_CODES, CODE_MEANINGS } from '@/lib/homes/classification-code'

/** Takes over what a report says: when, how it ends, by when the next, and how many observations of each code. */
export function HomeInspectionForm({ homeId, action }: { homeId: string; action: FormAction }) {
  return (
    <Form action={action} label="Inspection">
      <input type="hidden" name="homeId" value={homeId} />
      <DateField
        name="inspectedOn"
        legend="Date of the inspection"
        hint="As the report has it. If the day or the month is not known, leave it empty."
      />
      <RadioGroup
        name="assessment"
        legend="What the report says overall"
        defaultValue="unknown"
        choices={[
          { value: 'satisfactory', label: 'Satisfactory' },
          { value: 'unsatisfactory', label: 'Unsatisfactory' },
          { value: 'unknown', label: 'Not known' },
        ]}
      />
      <DateField
        name="nextDueOn"
        legend="Next inspection by, as the report says"
        hint="Where the report names a date or a number of years, it can only shorten what the law allows."
        optional
      />
      <fieldset className="mb-2 border-t border-line pt-5">
        <legend className="float-left mb-1 w-full text-lg font-semibold">Observations by code</legend>
        <p className="clear-both mb-4 text-sm text-slate">
          How many the report has of each. Empty is none. Each goes on record as an open defect.
        </p>
        <div className="grid gap-x-6 sm:grid-cols-2">
          {CLASSIFICATION_CODES.map((code) => (
            <TextField
              key={code}
              name={code}
              label={code}
              hint={CODE_MEANINGS[code]}
              width="tiny"
              inputMode="numeric"
              autoComplete="off"
              mono
            />
          ))}
        </div>
      </fieldset>
      <TextField
        name="note"
        label="Note"
        hint="The report’s number, the inspector or the firm."
        maxLength={300}
        optional
      />
      <div className="flex flex-wrap gap-3">
        <SubmitButton pendingText="Saving…">Record the inspection</SubmitButton>
        <ButtonLink href={`/homes/${homeId}`} kind="quiet">
          Back without recording
        </ButtonLink>
      </div>
    </Form>
  )
}
