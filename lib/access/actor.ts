import { type Role } from './role'

/** Who is acting, for which organisation, in which role, and over which patches. */
export type Actor = {
  readonly personId: string
  readonly name: string
  readonly email: string
  readonly organisationId: string
  readonly organisationName: string
  readonly role: Role
  /** 'all', or the patches this person answers for */
  readonly patches: 'all' | readonly string[]
}
