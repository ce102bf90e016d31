import { type Role } from '@/lib/access/role'

/** How long an invitation may be taken up [d]. Judgement: a week away does not miss it. */
export const INVITATION_DAYS = 7

/** Somebody who was asked to join and has not answered yet. */
export type Invitation = {
  readonly id: string
  readonly email: string
  readonly role: Role
  readonly patches: 'all' | readonly string[]
  /** [ISO 8601 moment] */
  readonly sentAt: string
  /** [ISO 8601 moment] */
  readonly expiresAt: string
}
