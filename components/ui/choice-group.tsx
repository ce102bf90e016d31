'use client'
import { type ReactNode } from 'react'
import { ChoiceRow } from './choice-row'
import { Field } from './field'
import { useFieldState } from './form-context'
import { type Choice } from './select-field'

type Shared = {
  name: string
  legend: ReactNode
  choices: readonly Choice[]
  hint?: ReactNode
  problem?: string
  optional?: boolean
}
type Props = Shared & { type: 'radio' | 'checkbox'; chosen: readonly string[] }

function ChoiceGroup({ type, name, legend, choices, hint, problem, optional, chosen }: Props) {
  const state = useFieldState(name, hint !== undefined, problem)
  const picked = state.typedList ?? chosen
  return (
    <Field state={state} label={legend} hint={hint} optional={optional} group>
      {choices.map((choice, at) => (
        <ChoiceRow
          key={choice.value}
          type={type}
          id={at === 0 ? state.id : `${state.id}-${at + 1}`}
          name={name}
          value={choice.value}
          label={choice.label}
          hint={choice.hint}
          disabled={choice.disabled}
          defaultChecked={picked.includes(choice.value)}
        />
      ))}
    </Field>
  )
}

/** One choice of a few, all in sight. */
export function RadioGroup({ defaultValue, ...rest }: Shared & { defaultValue?: string }) {
  return <ChoiceGroup {...rest} type="radio" chosen={defaultValue === undefined ? [] : [defaultValue]} />
}

/** Any number of a few choices. */
export function CheckboxGroup({ defaultValue = [], ...rest }: Shared & { defaultValue?: readonly string[] }) {
  return <ChoiceGroup {...rest} type="checkbox" chosen={defaultValue} />
}
