/** The roles a person can hold in one organisation. */
export const ROLES = ['manager', 'officer', 'auditor', 'supervisor', 'electrician'] as const
export type Role = (typeof ROLES)[number]

export const ROLE_NAMES: Record<Role, string> = {
  manager: 'Compliance manager',
  officer: 'Housing officer',
  auditor: 'Auditor',
  supervisor: 'Contractor’s supervisor',
  electrician: 'Electrician',
}
