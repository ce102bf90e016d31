'use client'
import { ButtonLink } from '@/components/ui/button-link'
import { RadioGroup } from '@/components/ui/choice-group'
import { Form } from '@/components/ui/form'
import { type Choice } from '@/components/ui/select-field'
import { SubmitButton } from '@/components/ui/submit-button'
import { type FormAction } from '@/lib/forms/form-state'
import { type HomeRow } from '@/lib/homes/home-row'
import { AddressFields, DutyFields, FilingFields, NoteField, PositionFields } from './home-identity-fields'

type Props = { home: HomeRow; note: string | null; patches: readonly Choice[]; action: FormAction }

const heading = 'mb-4 border-t border-line pt-5 text-xl'

/** Changes who and where a home is. All of it is sent, so what is emptied here becomes empty. */
export function HomeIdentityForm({ home, note, patches, action }: Props) {
  return (
    <Form action={action} label="Address and tenure">
      <input type="hidden" name="homeId" value={home.id} />
      <AddressFields home={home} />
      <RadioGroup
        name="kind"
        legend="What it is"
        defaultValue={home.kind}
        choices={[
          { value: 'dwelling', label: 'A dwelling' },
          {
            value: 'communal',
            label: 'A landlord’s supply',
            hint: 'Stairs, lifts and outside lights of a block.',
          },
        ]}
      />
      <h2 className={heading}>Duty</h2>
      <DutyFields home={home} />
      <h2 className={heading}>Where it is filed</h2>
      <FilingFields home={home} patches={patches} />
      <h2 className={heading}>On the map</h2>
      <PositionFields place={home.place} />
      <NoteField note={note} />
      <div className="flex flex-wrap gap-3">
        <SubmitButton pendingText="Saving…">Save the changes</SubmitButton>
        <ButtonLink href={`/homes/${home.id}`} kind="quiet">
          Leave it as it is
        </ButtonLink>
      </div>
    </Form>
  )
}
