'use client'
import { type ComponentProps, type ReactNode } from 'react'
import { classNames } from './class-names'
import { controlClass, Field } from './field'
import { useFieldState } from './form-context'

const WIDTHS = {
  full: 'w-full',
  /** as wide as what is expected: a width is a hint of length */
  long: 'w-full max-w-md',
  medium: 'w-full max-w-64',
  short: 'w-full max-w-40',
  tiny: 'w-full max-w-24',
} as const
export type FieldWidth = keyof typeof WIDTHS
export const widthClass = (width: FieldWidth): string => WIDTHS[width]

type Props = Omit<ComponentProps<'input'>, 'width' | 'size' | 'id'> & {
  name: string
  label: ReactNode
  hint?: ReactNode
  problem?: string
  optional?: boolean
  width?: FieldWidth
  /** figures that are read digit by digit */
  mono?: boolean
  prefix?: ReactNode
  suffix?: ReactNode
}

/** One line of text, a number, an e-mail address or a password. */
export function TextField(props: Props) {
  const {
    name,
    label,
    hint,
    problem,
    optional,
    width = 'long',
    mono,
    prefix,
    suffix,
    className,
    ...rest
  } = props
  const state = useFieldState(name, hint !== undefined, problem)
  const isSecret = rest.type === 'password'
  const input = (
    <input
      {...rest}
      id={state.id}
      name={name}
      defaultValue={isSecret ? undefined : (state.typed ?? rest.defaultValue)}
      aria-describedby={state.describedBy}
      aria-invalid={state.problem ? true : undefined}
      className={controlClass(state.problem, classNames(widthClass(width), mono && 'figures', className))}
    />
  )
  return (
    <Field state={state} label={label} hint={hint} optional={optional}>
      {prefix || suffix ? (
        <div className="flex items-center gap-2">
          {prefix}
          {input}
          {suffix}
        </div>
      ) : (
        input
      )}
    </Field>
  )
}
