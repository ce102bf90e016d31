'use client'
import { type ReactNode, useContext } from 'react'
import { useFormStatus } from 'react-dom'
import { buttonClass, type ButtonKind, type ButtonSize } from './button-class'
import { FormContext } from './form-context'

type Props = {
  children: ReactNode
  kind?: ButtonKind
  size?: ButtonSize
  /** what it says while the form is on its way: "Saving…" */
  pendingText?: string
  name?: string
  value?: string
  className?: string
}

/** Sends its form, and says so while it is on its way. It keeps the focus: it is never truly disabled. */
export function SubmitButton({
  children,
  kind,
  size,
  pendingText = 'Working…',
  name,
  value,
  className,
}: Props) {
  const form = useContext(FormContext)
  const status = useFormStatus()
  const pending = form?.pending || status.pending
  return (
    <button
      type="submit"
      name={name}
      value={value}
      aria-disabled={pending || undefined}
      onClick={(event) => {
        if (pending) event.preventDefault()
      }}
      className={buttonClass(kind, size, className)}
    >
      {pending ? pendingText : children}
      <span role="status" className="sr-only">
        {pending ? pendingText : ''}
      </span>
    </button>
  )
}
