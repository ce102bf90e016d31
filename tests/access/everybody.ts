/** Those as whom every page, handler and action is tried. All but the last stand in one organisation. */
export const EVERYBODY = [
  'signed out',
  'manager',
  'officer',
  'officer of another patch',
  'auditor',
  'supervisor',
  'electrician',
  'manager elsewhere',
] as const
export type Somebody = (typeof EVERYBODY)[number]

export const SIGNED_IN = EVERYBODY.filter((one) => one !== 'signed out')
export const MANAGERS = ['manager', 'manager elsewhere'] as const satisfies readonly Somebody[]
export const OFFICERS = ['officer', 'officer of another patch'] as const satisfies readonly Somebody[]
export const AUDITED = [...MANAGERS, 'auditor'] as const satisfies readonly Somebody[]
export const OFFICE = [...AUDITED, ...OFFICERS] as const satisfies readonly Somebody[]
/** Who may correct a home that they see. */
export const EDITORS = [...MANAGERS, ...OFFICERS] as const satisfies readonly Somebody[]
export const CONTRACTORS = ['supervisor', 'electrician'] as const satisfies readonly Somebody[]

/** Whose role would do, and who must not even learn that there is such a thing: other patch, other organisation. */
export const OUT_OF_REACH = [
  'officer of another patch',
  'manager elsewhere',
] as const satisfies readonly Somebody[]
export const ELSEWHERE = ['manager elsewhere'] as const satisfies readonly Somebody[]
