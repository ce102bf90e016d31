'use client'
import { type ComponentProps, type ReactNode } from 'react'
import { classNames } from './class-names'
import { controlClass, Field } from './field'
import { useFieldState } from './form-context'

type Props = Omit<ComponentProps<'textarea'>, 'id'> & {
  name: string
  label: ReactNode
  hint?: ReactNode
  problem?: string
  optional?: boolean
}

/** Several lines of text. */
export function TextAreaField({ name, label, hint, problem, optional, rows = 4, className, ...rest }: Props) {
  const state = useFieldState(name, hint !== undefined, problem)
  return (
    <Field state={state} label={label} hint={hint} optional={optional}>
      <textarea
        {...rest}
        id={state.id}
        name={name}
        rows={rows}
        defaultValue={state.typed ?? rest.defaultValue}
        aria-describedby={state.describedBy}
        aria-invalid={state.problem ? true : undefined}
        className={controlClass(state.problem, classNames('w-full', className))}
      />
    </Field>
  )
}
