'use client'
import { useEffect, useRef } from 'react'
import { type FieldProblem } from '@/lib/errors/expected'
import { type FormState } from '@/lib/forms/form-state'
import { fieldId } from './form-context'

type Props = {
  formId: string
  problems: readonly FieldProblem[]
  message?: string | null
  link?: FormState['link']
}

/** A date's day stands for the whole date, and has the id of the date. */
const controlOf = (id: string) =>
  document.getElementById(id) ?? document.getElementById(id.replace(/-day$/, ''))

/** What is wrong with a form, above it: takes the focus, and leads to each field. Give it a new `key` for each try. */
export function ErrorSummary({ formId, problems, message, link }: Props) {
  const box = useRef<HTMLDivElement>(null)
  useEffect(() => box.current?.focus(), [])
  const lines = problems.length > 0 ? problems : message ? [{ field: '', problem: message }] : []
  return (
    <div
      ref={box}
      role="alert"
      tabIndex={-1}
      aria-labelledby={`${formId}-summary`}
      className="mb-8 max-w-reading rounded-plate border-4 border-madder bg-surface p-4 sm:p-5"
    >
      <h2 id={`${formId}-summary`} className="text-xl">
        There is a problem
      </h2>
      <ul className="mt-2 space-y-1">
        {lines.map(({ field, problem }) => (
          <li key={`${field} ${problem}`}>
            {field ? (
              <a
                href={`#${fieldId(formId, field)}`}
                className="font-semibold text-madder underline underline-offset-4 hover:text-madder-deep"
                onClick={(event) => {
                  const control = controlOf(fieldId(formId, field))
                  if (!control) return
                  event.preventDefault()
                  control.scrollIntoView({ block: 'center' })
                  control.focus()
                }}
              >
                {problem}
              </a>
            ) : (
              <span className="font-semibold text-madder">{problem}</span>
            )}
          </li>
        ))}
      </ul>
      {link && (
        <p className="mt-3">
          <a href={link.href} target="_blank" rel="noopener" className="link-block link">
            {link.text}
          </a>
        </p>
      )}
    </div>
  )
}
