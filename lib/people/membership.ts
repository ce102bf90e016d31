import { type Role } from '@/lib/access/role'

/** Somebody who has access to the organisation. */
export type Membership = {
  readonly personId: string
  readonly name: string
  readonly email: string
  readonly role: Role
  readonly patches: 'all' | readonly string[]
  /** when access was first given [ISO 8601 moment] */
  readonly since: string
}
