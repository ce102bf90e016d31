import { Badge } from '@/components/ui/badge'
import { Form } from '@/components/ui/form'
import { SubmitButton } from '@/components/ui/submit-button'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { ROLE_NAMES } from '@/lib/access/role'
import { type FormAction } from '@/lib/forms/form-state'
import { momentInWords } from './moment-in-words'
import { patchesInWords } from './patches-in-words'
import { type InvitationLine } from './people-lines'

type Props = {
  invitations: readonly InvitationLine[]
  mayManage: boolean
  onResend: FormAction
  onWithdraw: FormAction
}

/** Invitations that nobody has answered: how long their links work, and for a manager to send again or withdraw. */
export function InvitationsTable({ invitations, mayManage, onResend, onWithdraw }: Props) {
  return (
    <Table caption="Invitations not answered yet">
      <thead>
        <Row>
          <HeadCell>E-mail address</HeadCell>
          <HeadCell>Role</HeadCell>
          <HeadCell>Will see</HeadCell>
          <HeadCell>Link</HeadCell>
          {mayManage && <HeadCell>Change</HeadCell>}
        </Row>
      </thead>
      <tbody>
        {invitations.map((invitation) => (
          <Row key={invitation.id}>
            <RowHead>{invitation.email}</RowHead>
            <Cell>{ROLE_NAMES[invitation.role]}</Cell>
            <Cell>{patchesInWords(invitation.role, invitation.patchNames)}</Cell>
            <Cell className="whitespace-nowrap">
              {invitation.hasRunOut ? (
                <Badge tone="amber">Ran out {momentInWords(invitation.expiresAt)}</Badge>
              ) : (
                `Works until ${momentInWords(invitation.expiresAt)}`
              )}
            </Cell>
            {mayManage && (
              <Cell>
                <div className="flex flex-wrap gap-2">
                  <Form action={onResend} label={`Send again to ${invitation.email}`}>
                    <input type="hidden" name="invitationId" value={invitation.id} />
                    <SubmitButton kind="secondary" size="compact" pendingText="Sending…">
                      Send again<span className="sr-only"> to {invitation.email}</span>
                    </SubmitButton>
                  </Form>
                  <Form action={onWithdraw} label={`Withdraw the invitation of ${invitation.email}`}>
                    <input type="hidden" name="invitationId" value={invitation.id} />
                    <SubmitButton kind="quiet" size="compact" pendingText="Withdrawing…">
                      Withdraw<span className="sr-only"> the invitation of {invitation.email}</span>
                    </SubmitButton>
                  </Form>
                </div>
              </Cell>
            )}
          </Row>
        ))}
      </tbody>
    </Table>
  )
}
