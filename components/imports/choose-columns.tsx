import { Card } from '@/components/ui/card'
import { Form } from '@/components/ui/form'
import { SelectField } from '@/components/ui/select-field'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'
import { type ImportLayout } from '@/lib/imports/import-layout'
import { ColumnChoices } from './column-choices'

type Props = { importId: string; layout: ImportLayout; onChooseSheet: FormAction; onCheck: FormAction }

/** Which sheet, which header row, which column is what: guessed, and the person's to put right. */
export function ChooseColumns({ importId, layout, onChooseSheet, onCheck }: Props) {
  const named = Object.keys(layout.mapping).length
  return (
    <div className="space-y-6">
      <Card title="Where the list is" sub={layout.fileKind}>
        <Form
          action={onChooseSheet}
          label="Sheet and header row"
          className="flex flex-wrap items-end gap-x-6"
        >
          <input type="hidden" name="importId" value={importId} />
          {layout.sheets.length > 1 ? (
            <SelectField
              name="sheet"
              label="Sheet"
              width="medium"
              defaultValue={String(layout.sheet)}
              choices={layout.sheets.map(({ name, index }) => ({
                value: String(index),
                label: name || `Sheet ${index + 1}`,
              }))}
            />
          ) : (
            <input type="hidden" name="sheet" value={layout.sheet} />
          )}
          <TextField
            name="headerRow"
            label="Row with the column headings"
            inputMode="numeric"
            width="tiny"
            defaultValue={String(layout.headerRow)}
          />
          <div className="mb-6">
            <SubmitButton kind="secondary" pendingText="Reading…">
              Read again
            </SubmitButton>
          </div>
        </Form>
      </Card>
      <Card
        title="What each column is"
        sub={`${named} of ${layout.headings.length} columns were recognised. Put right what is wrong; columns left out are not read.`}
      >
        <Form action={onCheck} label="Columns">
          <input type="hidden" name="importId" value={importId} />
          <ColumnChoices layout={layout} />
          <div className="mt-6">
            <SubmitButton pendingText="Starting…">Check every row</SubmitButton>
          </div>
          <p className="mt-3 text-slate">Nothing is taken in yet: you will see every problem first.</p>
        </Form>
      </Card>
    </div>
  )
}
