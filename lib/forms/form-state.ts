/** What a form knows after it was sent. Pure, so that components and server actions share it. */
import { type FieldProblem } from '@/lib/errors/expected'

export type FormState = {
  /** idle: not sent yet; refused: something for the person to put right; failed: a fault of ours */
  readonly status: 'idle' | 'done' | 'refused' | 'failed'
  /** every problem, each with the name of its field */
  readonly problems: readonly FieldProblem[]
  /** a sentence for the person, or null */
  readonly message: string | null
  /** a way out of the refusal, opened in a new tab so that nothing typed is lost */
  readonly link: { readonly href: string; readonly text: string } | null
  /** what was typed, to fill the form again; never passwords and files */
  readonly values: Readonly<Record<string, string | string[]>>
  /** what the use-case gave back, where the form shows it */
  readonly result: unknown
}

/** A form action as `useActionState` takes it. */
export type FormAction = (state: FormState, form: FormData) => Promise<FormState>

/** A form that was not sent yet. */
export const IDLE: FormState = {
  status: 'idle',
  problems: [],
  message: null,
  link: null,
  values: {},
  result: null,
}
