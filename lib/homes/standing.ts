/** A home's duty state at a date. */
export const STANDINGS = ['in date', 'due', 'lapsed', 'never inspected', 'unknown date'] as const
export type Standing = (typeof STANDINGS)[number]

/** What is on record of a home's inspections: a dated report, the knowledge that there is none, or nothing. */
export type InspectionRecord = 'dated' | 'never' | 'unknown'
