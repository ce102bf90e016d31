import { Card } from '@/components/ui/card'
import { Disclosure } from '@/components/ui/disclosure'
import { Form } from '@/components/ui/form'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'

type Props = {
  patches: readonly { readonly id: string; readonly name: string }[]
  mayManage: boolean
  onAdd: FormAction
  onRename: FormAction
}

/** The parts of the portfolio that officers answer for. */
export function PatchesCard({ patches, mayManage, onAdd, onRename }: Props) {
  return (
    <Card
      id="patches"
      title="Patches"
      sub="Parts of your stock, each with the officers who answer for it. An import makes those it names."
    >
      {patches.length === 0 && (
        <p className="mb-4 text-slate">There are none. Every officer sees every home.</p>
      )}
      <ul className="divide-y divide-line">
        {patches.map(({ id, name }) => (
          <li key={id} className="py-2">
            <p className="font-semibold">{name}</p>
            {mayManage && (
              <Disclosure
                summary={
                  <>
                    Rename<span className="sr-only"> {name}</span>
                  </>
                }
              >
                <Form action={onRename} label={`Rename ${name}`}>
                  <input type="hidden" name="patchId" value={id} />
                  <TextField name="name" label={`New name for ${name}`} defaultValue={name} />
                  <SubmitButton size="compact" pendingText="Renaming…">
                    Rename
                  </SubmitButton>
                </Form>
              </Disclosure>
            )}
          </li>
        ))}
      </ul>
      {mayManage && (
        <Form action={onAdd} label="Add a patch" className="mt-6 border-t border-line pt-5">
          <TextField name="name" label="Another patch" autoComplete="off" />
          <SubmitButton kind="secondary" pendingText="Adding…">
            Add
          </SubmitButton>
        </Form>
      )}
    </Card>
  )
}
