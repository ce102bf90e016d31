'use client'
import { CheckboxField } from './checkbox-field'
import { RadioGroup } from './choice-group'
import { DateField } from './date-field'
import { FileDrop } from './file-drop'
import { Form } from './form'
import { SelectField } from './select-field'
import { SubmitButton } from './submit-button'
import { TextAreaField } from './text-area-field'
import { TextField } from './text-field'
import { IDLE } from '@/lib/forms/form-state'
import { fieldsOf } from '@/lib/forms/fields-of'
import { typedValues } from '@/lib/forms/typed-values'

export function GalleryForm() {
  return (
    <Form
      className="max-w-reading py-8"
      action={async (_s, form) => {
        await new Promise((r) => setTimeout(r, 400))
        return {
          ...IDLE,
          status: 'refused',
          problems: [
            { field: 'email', problem: 'Enter an e-mail address.' },
            { field: 'on', problem: 'Enter a real date.' },
            { field: 'board', problem: 'Choose one.' },
          ],
          values: typedValues(fieldsOf(form.entries())),
        }
      }}
    >
      <TextField name="email" label="E-mail address" hint="We send a link to it." type="email" />
      <TextField name="uprn" label="UPRN" mono width="short" optional />
      <SelectField
        name="cover"
        label="RCD cover"
        choices={[
          { value: '', label: 'Not known' },
          { value: 'all', label: 'All circuits' },
        ]}
      />
      <RadioGroup
        name="board"
        legend="What is on the wall?"
        choices={[
          { value: 'r', label: 'Rewireable fuses', hint: 'Bare wire' },
          { value: 'b', label: 'Circuit breakers' },
        ]}
      />
      <DateField name="on" legend="When was it inspected?" hint="For example, 14 3 2021 or 14 mar 2021" />
      <CheckboxField name="yes" label="Send me a digest" />
      <TextAreaField name="note" label="Note" optional />
      <FileDrop name="file" label="Stock list" hint="CSV or XLSX" accept=".csv,.xlsx" />
      <SubmitButton pendingText="Saving…">Save</SubmitButton>
    </Form>
  )
}
