import { Card } from '@/components/ui/card'
import { DefinitionList } from '@/components/ui/definition-list'
import { Form } from '@/components/ui/form'
import { PageHeader } from '@/components/ui/page-header'
import { SelectField } from '@/components/ui/select-field'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'
import { NATION_NAMES, NATIONS } from '@/lib/homes/nation'
import { type Organisation } from '@/lib/organisations/organisation'
import { PatchesCard } from './patches-card'

type Props = {
  organisation: Organisation
  patches: readonly { readonly id: string; readonly name: string }[]
  mayManage: boolean
  onChange: FormAction
  onAddPatch: FormAction
  onRenamePatch: FormAction
}

const CHOICES = NATIONS.map((value) => ({ value, label: NATION_NAMES[value] }))

/** The organisation's settings and its patches; for an auditor to read, for a manager to change. */
export function SettingsScreen({
  organisation,
  patches,
  mayManage,
  onChange,
  onAddPatch,
  onRenamePatch,
}: Props) {
  const { name, nation, noticeDays } = organisation
  return (
    <>
      <PageHeader title={`Settings of ${name}`} />
      <div className="grid max-w-3xl gap-8">
        <Card id="organisation" title="Organisation">
          {mayManage ? (
            <Form action={onChange}>
              <TextField name="name" label="Name" defaultValue={name} autoComplete="organization" />
              <SelectField
                name="nation"
                label="Nation"
                hint="For homes that are added without one. Each home keeps its own."
                choices={CHOICES}
                defaultValue={nation}
                width="medium"
              />
              <TextField
                name="noticeDays"
                label="A report is due from"
                hint="From 1 to 365 days before it lapses, a home’s standing is “due”."
                defaultValue={noticeDays}
                inputMode="numeric"
                width="tiny"
                suffix="days before it lapses"
              />
              <SubmitButton pendingText="Saving…">Save</SubmitButton>
            </Form>
          ) : (
            <DefinitionList
              items={[
                { term: 'Name', value: name },
                { term: 'Nation', value: NATION_NAMES[nation] },
                { term: 'A report is due from', value: `${noticeDays} days before it lapses` },
              ]}
            />
          )}
        </Card>
        <PatchesCard patches={patches} mayManage={mayManage} onAdd={onAddPatch} onRename={onRenamePatch} />
      </div>
    </>
  )
}
