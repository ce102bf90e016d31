'use client'
import { ButtonLink } from '@/components/ui/button-link'
import { RadioGroup } from '@/components/ui/choice-group'
import { DateField } from '@/components/ui/date-field'
import { Form } from '@/components/ui/form'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextAreaField } from '@/components/ui/text-area-field'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'
import { CLASSIFICATION_CODES, CODE_MEANINGS } from '@/lib/homes/classification-code'

/** Puts one thing that is to be put right on record, with the code that the inspector gave it. */
export function HomeDefectForm({ homeId, action }: { homeId: string; action: FormAction }) {
  return (
    <Form action={action} label="Defect">
      <input type="hidden" name="homeId" value={homeId} />
      <RadioGroup
        name="code"
        legend="Code"
        hint="As the inspector gave it."
        choices={CLASSIFICATION_CODES.map((code) => ({
          value: code,
          label: `${code}: ${CODE_MEANINGS[code]}`,
        }))}
      />
      <TextAreaField
        name="description"
        label="What is wrong"
        hint="In the words of the report."
        maxLength={500}
        className="max-w-reading"
      />
      <TextField
        name="location"
        label="Where in the home"
        hint="Circuit, room or device."
        maxLength={160}
        optional
      />
      <DateField name="raisedOn" legend="Found on" hint="All empty means today." optional />
      <div className="flex flex-wrap gap-3">
        <SubmitButton pendingText="Saving…">Add the defect</SubmitButton>
        <ButtonLink href={`/homes/${homeId}`} kind="quiet">
          Back without adding
        </ButtonLink>
      </div>
    </Form>
  )
}
