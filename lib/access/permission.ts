/** What each role may do, as one table. A use-case names the permission it needs; nothing else decides. */
import { type Role } from './role'

const OFFICE: readonly Role[] = ['manager', 'officer', 'auditor']

/** permission: [what it lets a person do, who may] */
export const PERMISSIONS = {
  'homes.read': ['See homes, their facts, score and map', OFFICE],
  'homes.edit': ['Correct a home’s facts', ['manager', 'officer']],
  'homes.add': ['Add a home', ['manager']],
  'homes.export': ['Take a list of homes away as a file', OFFICE],
  'imports.read': ['See imports and their reports', ['manager', 'auditor']],
  'imports.run': ['Import a stock list', ['manager']],
  'people.read': ['See who has access', ['manager', 'auditor']],
  'people.manage': ['Invite people, change roles, end access', ['manager']],
  'organisation.read': ['See the organisation’s settings', ['manager', 'auditor']],
  'organisation.manage': ['Change the organisation’s settings and patches', ['manager']],
  'audit.read': ['Read the audit trail', ['manager', 'auditor']],
  'method.read': ['See how the score is made', OFFICE],
  'visits.read': ['See work issued to their firm', ['supervisor', 'electrician']],
} as const satisfies Record<string, readonly [string, readonly Role[]]>

export type Permission = keyof typeof PERMISSIONS
