'use client'
import { type ReactNode } from 'react'
import { ChoiceRow } from './choice-row'
import { useFieldState } from './form-context'

type Props = {
  name: string
  label: ReactNode
  hint?: ReactNode
  value?: string
  defaultChecked?: boolean
  problem?: string
  required?: boolean
}

/** One thing to say yes to. */
export function CheckboxField({
  name,
  label,
  hint,
  value = 'yes',
  defaultChecked,
  problem,
  required,
}: Props) {
  const state = useFieldState(name, false, problem)
  const checked = state.typedList ? state.typedList.includes(value) : defaultChecked
  return (
    <div className={state.problem ? 'mb-6 border-l-4 border-madder pl-4' : 'mb-6'}>
      {state.problem && (
        <p id={state.problemId} className="font-semibold text-madder">
          <span className="sr-only">Error: </span>
          {state.problem}
        </p>
      )}
      <ChoiceRow
        type="checkbox"
        id={state.id}
        name={name}
        value={value}
        label={label}
        hint={hint}
        required={required}
        defaultChecked={checked}
        aria-invalid={state.problem ? true : undefined}
        aria-describedby={state.problem ? state.problemId : undefined}
      />
    </div>
  )
}
