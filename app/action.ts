/** Server actions for forms: actor, parse, call, and refusals back to the form. An action is one line above this. */
import 'server-only'
import { revalidatePath } from 'next/cache'
import { unstable_rethrow } from 'next/navigation'
import { type z } from 'zod'
import { type Actor } from '@/lib/access/actor'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Invalid, isRefusal } from '@/lib/errors/expected'
import { fieldsOf } from '@/lib/forms/fields-of'
import { type FormAction, type FormState, IDLE } from '@/lib/forms/form-state'
import { problemsOf } from '@/lib/forms/problems-of'
import { typedValues } from '@/lib/forms/typed-values'
import { today } from '@/lib/platform/clock'
import { logFault } from '@/lib/platform/log-fault'
import { type Visitor } from '@/lib/use-cases/people/visitor'
import { optionalActor } from './session'
import { visitor } from './visitor'

type Values = FormState['values']

export type ActionOptions<Input, Result> = {
  /** the sentence shown when it is done */
  readonly done?: string | ((result: Result, input: Input) => string)
  /** what follows: a redirect, or revalidating some paths; without it, what is on screen is read again */
  readonly then?: (result: Result, input: Input) => void | Promise<void>
}

/** The one place where a refusal becomes the state of a form, and a fault an id. */
function stateOf(thrown: unknown, values: Values): FormState {
  unstable_rethrow(thrown)
  if (thrown instanceof Invalid) return { ...IDLE, status: 'refused', problems: thrown.problems, values }
  if (isRefusal(thrown)) return { ...IDLE, status: 'refused', message: thrown.message, values }
  const fault = logFault(thrown, 'action')
  const message = `Something went wrong on our side, and nothing was saved. Try again; if it happens again, quote ${fault}.`
  return { ...IDLE, status: 'failed', message, values }
}

const SIGNED_OUT = {
  status: 'refused',
  message:
    'You are no longer signed in. Sign in again in a new tab, then come back here and send this again: nothing you typed is lost.',
  link: { href: '/sign-in', text: 'Sign in in a new tab' },
} as const

async function run<Schema extends z.ZodType, Who, Result>(
  schema: Schema,
  who: () => Promise<Who | null>,
  useCase: (who: Who, input: z.output<Schema>, today: CalendarDay) => Promise<Result>,
  { done, then }: ActionOptions<z.output<Schema>, Result>,
  form: FormData,
): Promise<FormState> {
  const fields = fieldsOf(form.entries())
  const values = typedValues(fields)
  let result: Result
  let input: z.output<Schema>
  try {
    const somebody = await who()
    if (somebody === null) return { ...IDLE, ...SIGNED_OUT, values }
    const parsed = schema.safeParse(fields)
    if (!parsed.success) throw new Invalid(problemsOf(parsed.error))
    input = parsed.data
    result = await useCase(somebody, input, today())
  } catch (thrown) {
    return stateOf(thrown, values)
  }
  if (then) await then(result, input)
  else revalidatePath('/', 'layout')
  const message = typeof done === 'function' ? done(result, input) : (done ?? null)
  return { ...IDLE, status: 'done', message, result: result ?? null }
}

/**
 * A server action for somebody who is signed in.
 * @example export const correctFact = action(CorrectFact, correctHomeFact, { done: 'Saved.' })
 */
export function action<Schema extends z.ZodType, Result>(
  schema: Schema,
  useCase: (actor: Actor, input: z.output<Schema>, today: CalendarDay) => Promise<Result>,
  options: ActionOptions<z.output<Schema>, Result> = {},
): FormAction {
  return async (_state, form) => run(schema, optionalActor, useCase, options, form)
}

/** A server action for anybody: signing in and up, invitations, forgotten passwords. */
export function publicAction<Schema extends z.ZodType, Result>(
  schema: Schema,
  useCase: (visitor: Visitor, input: z.output<Schema>, today: CalendarDay) => Promise<Result>,
  options: ActionOptions<z.output<Schema>, Result> = {},
): FormAction {
  return async (_state, form) => run(schema, visitor, useCase, options, form)
}
