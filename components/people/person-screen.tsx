import { Breadcrumb } from '@/components/ui/breadcrumb'
import { Card } from '@/components/ui/card'
import { Disclosure } from '@/components/ui/disclosure'
import { Form } from '@/components/ui/form'
import { Notice } from '@/components/ui/notice'
import { PageHeader } from '@/components/ui/page-header'
import { SubmitButton } from '@/components/ui/submit-button'
import { type FormAction } from '@/lib/forms/form-state'
import { type Membership } from '@/lib/people/membership'
import { AccessFields } from './access-fields'

type Props = {
  person: Membership
  patches: readonly { readonly id: string; readonly name: string }[]
  isLastManager: boolean
  isSelf: boolean
  onChange: FormAction
  onEnd: FormAction
}

/** One person's role and patches, and the end of their access. */
export function PersonScreen({ person, patches, isLastManager, isSelf, onChange, onEnd }: Props) {
  return (
    <>
      <PageHeader
        above={<Breadcrumb steps={[{ href: '/people', label: 'People' }]} here={person.name} />}
        title={isSelf ? `${person.name} (you)` : person.name}
        sub={person.email}
      />
      <div className="grid max-w-3xl gap-8">
        {isLastManager && (
          <Notice title="The only compliance manager">
            An organisation needs one. Give somebody else that role first; then this one can be changed or
            ended.
          </Notice>
        )}
        <Card id="access" title="Role and patches" sub="It holds from the next page they open.">
          <Form action={onChange}>
            <input type="hidden" name="personId" value={person.personId} />
            <AccessFields
              patches={patches}
              role={person.role}
              patchIds={person.patches === 'all' ? [] : person.patches}
            />
            <SubmitButton pendingText="Saving…">Save</SubmitButton>
          </Form>
        </Card>
        {!isLastManager && (
          <Card id="end" title="End access">
            <p className="mb-3 max-w-reading">
              {isSelf ? 'You are' : `${person.name} is`} signed out at once and cannot come in again unless
              invited. What was done stays on record.
            </p>
            <Disclosure summary="End access now">
              <Form action={onEnd}>
                <input type="hidden" name="personId" value={person.personId} />
                <SubmitButton kind="danger" pendingText="Ending…">
                  {`Yes, end access of ${person.name}`}
                </SubmitButton>
              </Form>
            </Disclosure>
          </Card>
        )}
      </div>
    </>
  )
}
