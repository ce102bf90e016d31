import { z } from 'zod'
import { type Nation, NATIONS } from '@/lib/homes/nation'
import { oneLine } from '@/lib/forms/one-line'

export type Organisation = {
  readonly id: string
  readonly slug: string
  readonly name: string
  readonly kind: 'provider' | 'landlord'
  readonly nation: Nation
  /** a report this close to its end is due [days] */
  readonly noticeDays: number
}

/** An organisation as somebody may choose it: for the one they work for now. */
export type OrganisationChoice = { readonly organisationId: string; readonly name: string }

export const organisationName = oneLine('Enter the name of your organisation, or the name you let as.', 160)
export const nation = z.enum(NATIONS, { error: 'Choose the nation.' })
