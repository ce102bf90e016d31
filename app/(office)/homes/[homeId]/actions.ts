'use server'
import { refresh } from 'next/cache'
import { redirect } from 'next/navigation'
import { z } from 'zod'
import { action } from '@/app/action'
import { touchedFacts } from '@/components/homes/home-touched-facts'
import { type FormState } from '@/lib/forms/form-state'
import { addDefect, AddDefect } from '@/lib/use-cases/homes/add-defect'
import { changeHome, ChangeHome } from '@/lib/use-cases/homes/change-home'
import { closeDefect, CloseDefect } from '@/lib/use-cases/homes/close-defect'
import { recordFact, RecordFactForm } from '@/lib/use-cases/homes/record-fact'
import { recordInspection, RecordInspection } from '@/lib/use-cases/homes/record-inspection'
import { homeSaying } from './said'

type OfHome = { readonly homeId: string }

const correct = action(z.preprocess(touchedFacts, RecordFactForm), recordFact, {
  then: (_, { homeId }) => redirect(homeSaying(homeId, 'facts')),
})

/** A refusal without a field is that somebody else was first: what they recorded is read again, to stand beside. */
export async function correctFacts(state: FormState, form: FormData): Promise<FormState> {
  const next = await correct(state, form)
  if (next.status === 'refused' && next.problems.length === 0) refresh()
  return next
}

export const record = action(RecordInspection, recordInspection, {
  then: (_, { homeId }: OfHome) => redirect(homeSaying(homeId, 'inspection')),
})

export const add = action(AddDefect, addDefect, {
  then: (_, { homeId }: OfHome) => redirect(homeSaying(homeId, 'defect')),
})

export const close = action(CloseDefect, closeDefect, {
  then: (_, { homeId }: OfHome) => redirect(homeSaying(homeId, 'closed')),
})

export const change = action(ChangeHome, changeHome, {
  then: (_, { homeId }: OfHome) => redirect(homeSaying(homeId, 'identity')),
})
