import { Card } from '@/components/ui/card'
import { Form } from '@/components/ui/form'
import { PageHeader } from '@/components/ui/page-header'
import { SubmitButton } from '@/components/ui/submit-button'
import { TextField } from '@/components/ui/text-field'
import { type FormAction } from '@/lib/forms/form-state'
import { AccessFields } from './access-fields'
import { InvitationsTable } from './invitations-table'
import { type InvitationLine, type PersonLine } from './people-lines'
import { PeopleTable } from './people-table'

type Props = {
  organisationName: string
  people: readonly PersonLine[]
  invitations: readonly InvitationLine[]
  patches: readonly { readonly id: string; readonly name: string }[]
  mayManage: boolean
  onInvite: FormAction
  onResend: FormAction
  onWithdraw: FormAction
}

/** Who has access, who was asked to join, and a form to ask somebody. */
export function PeopleScreen(props: Props) {
  const { organisationName, people, invitations, patches, mayManage, onInvite, onResend, onWithdraw } = props
  const count = people.length === 1 ? 'One person has' : `${people.length} people have`
  return (
    <>
      <PageHeader title={`${count} access to ${organisationName}`} />
      <PeopleTable people={people} mayManage={mayManage} />
      {invitations.length > 0 && (
        <section aria-labelledby="invitations" className="mt-10">
          <h2 id="invitations" className="mb-3 text-xl">
            Asked to join
          </h2>
          <InvitationsTable
            invitations={invitations}
            mayManage={mayManage}
            onResend={onResend}
            onWithdraw={onWithdraw}
          />
        </section>
      )}
      {mayManage && (
        <Card
          id="invite"
          title="Invite somebody"
          sub="They get a letter with a link that works for seven days."
          className="mt-10 max-w-3xl"
        >
          <Form action={onInvite}>
            <TextField
              name="email"
              type="email"
              label="E-mail address"
              autoComplete="off"
              inputMode="email"
              spellCheck={false}
            />
            <AccessFields patches={patches} />
            <SubmitButton pendingText="Sending…">Send the invitation</SubmitButton>
          </Form>
        </Card>
      )}
    </>
  )
}
