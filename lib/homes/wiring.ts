/** The insulation of the fixed wiring, which tells its age. */
export const WIRINGS = ['pvc', 'rubber', 'lead', 'mineral', 'mixed', 'unknown'] as const
export type Wiring = (typeof WIRINGS)[number]

export const WIRING_NAMES: Record<Wiring, string> = {
  pvc: 'PVC',
  rubber: 'Rubber (VIR or TRS)',
  lead: 'Lead sheathed',
  mineral: 'Mineral insulated',
  mixed: 'Mixed',
  unknown: 'Not known',
}
