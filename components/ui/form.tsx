'use client'
import { unstable_rethrow } from 'next/navigation'
import {
  type ReactNode,
  type SubmitEvent,
  useActionState,
  useEffect,
  useId,
  useMemo,
  useRef,
  useState,
  useTransition,
} from 'react'
import { type FormAction, type FormState, IDLE } from '@/lib/forms/form-state'
import { ErrorSummary } from './error-summary'
import { FormContext } from './form-context'
import { Notice } from './notice'

type Props = {
  action: FormAction
  children: ReactNode | ((state: FormState) => ReactNode)
  className?: string
  /** names the form for those who listen, where a page has several */
  label?: string
  /** called once for each time that the form went well */
  onDone?: (state: FormState) => void
  /** the caller shows the message of a form that went well itself */
  quietWhenDone?: boolean
}

const LOST: Pick<FormState, 'status' | 'message' | 'link'> = {
  status: 'failed',
  message:
    'The connection was lost, so this may not have been saved. What you typed is still here: send it again.',
  link: null,
}

/** `Error: ` before the page's title, for as long as there is a problem. */
function useErrorTitle(hasProblem: boolean) {
  useEffect(() => {
    if (!hasProblem) return
    const before = document.title
    document.title = `Error: ${before.replace(/^Error: /, '')}`
    return () => {
      document.title = before
    }
  }, [hasProblem])
}

/**
 * A form that sends itself to a server action, and keeps what was typed through a refusal, a fault and a lost
 * connection. Without any script it is an ordinary form with the same action, and its fields are filled again from
 * what the server sends back.
 */
export function Form({ action, children, className, label, onDone, quietWhenDone }: Props) {
  const id = useId()
  const form = useRef<HTMLFormElement>(null)
  const [posted, plainAction] = useActionState(action, IDLE)
  const [sent, setSent] = useState<{ state: FormState; attempt: number }>({ state: IDLE, attempt: 0 })
  const [pending, startTransition] = useTransition()
  const state = sent.attempt > 0 ? sent.state : posted
  const hasProblem = state.status === 'refused' || state.status === 'failed'
  useErrorTitle(hasProblem)

  const send = (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault()
    if (pending) return
    const typed = new FormData(event.currentTarget, event.nativeEvent.submitter)
    startTransition(async () => {
      let next: FormState
      try {
        next = await action(state, typed)
      } catch (thrown) {
        unstable_rethrow(thrown)
        next = { ...IDLE, ...LOST }
      }
      startTransition(() => setSent(({ attempt }) => ({ state: next, attempt: attempt + 1 })))
      if (next.status === 'done') {
        form.current?.reset()
        onDone?.(next)
      }
    })
  }

  const context = useMemo(
    () => ({
      id,
      problems: state.problems,
      values: hasProblem && Object.keys(state.values).length > 0 ? state.values : null,
      pending,
    }),
    [id, state, hasProblem, pending],
  )
  return (
    <FormContext value={context}>
      {hasProblem && <ErrorSummary key={sent.attempt} formId={id} {...state} />}
      {state.status === 'done' && state.message && !quietWhenDone && (
        <Notice tone="verdigris" announce className="mb-6">
          {state.message}
        </Notice>
      )}
      <form
        ref={form}
        action={plainAction}
        onSubmit={send}
        aria-label={label}
        className={className}
        noValidate
      >
        {typeof children === 'function' ? children(state) : children}
      </form>
    </FormContext>
  )
}
