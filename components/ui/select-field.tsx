'use client'
import { type ComponentProps, type ReactNode } from 'react'
import { classNames } from './class-names'
import { controlClass, Field } from './field'
import { useFieldState } from './form-context'
import { type FieldWidth, widthClass } from './text-field'

export type Choice = {
  readonly value: string
  readonly label: string
  readonly hint?: ReactNode
  readonly disabled?: boolean
}

type Props = Omit<ComponentProps<'select'>, 'id' | 'children'> & {
  name: string
  label: ReactNode
  choices: readonly Choice[]
  hint?: ReactNode
  problem?: string
  optional?: boolean
  width?: FieldWidth
}

/** One choice of a list, in the system's own control: it works with every keyboard, phone and reader. */
export function SelectField(props: Props) {
  const { name, label, choices, hint, problem, optional, width = 'long', className, ...rest } = props
  const state = useFieldState(name, hint !== undefined, problem)
  const chosen = state.typed ?? rest.defaultValue
  return (
    <Field state={state} label={label} hint={hint} optional={optional}>
      {/* The framework resets a form after its action, and a select only to what it was first drawn with: draw it anew. */}
      <select
        {...rest}
        key={String(chosen)}
        id={state.id}
        name={name}
        defaultValue={chosen}
        aria-describedby={state.describedBy}
        aria-invalid={state.problem ? true : undefined}
        className={controlClass(state.problem, classNames('pr-8', widthClass(width), className))}
      >
        {choices.map(({ value, label: text, disabled }) => (
          <option key={value} value={value} disabled={disabled}>
            {text}
          </option>
        ))}
      </select>
    </Field>
  )
}
