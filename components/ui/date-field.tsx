'use client'
import { type ReactNode, useContext } from 'react'
import { type CalendarDay, partsOf } from '@/lib/calendar/calendar-day'
import { controlClass, Field } from './field'
import { FormContext, useFieldState } from './form-context'

const PARTS = [
  { part: 'day', label: 'Day', width: 'w-16' },
  { part: 'month', label: 'Month', width: 'w-20' },
  { part: 'year', label: 'Year', width: 'w-24' },
] as const

type Props = {
  /** the three inputs are called `name-day`, `name-month` and `name-year` */
  name: string
  legend: ReactNode
  hint?: ReactNode
  problem?: string
  optional?: boolean
  defaultValue?: CalendarDay | null
}

/** A date as day, month and year. A month may be a word, "jan": people copy what the report says. */
export function DateField({ name, legend, hint, problem, optional, defaultValue }: Props) {
  const form = useContext(FormContext)
  const own = form?.problems.find((one) => PARTS.some(({ part }) => one.field === `${name}-${part}`))
  const state = useFieldState(name, hint !== undefined, problem ?? own?.problem)
  const parts = defaultValue ? partsOf(defaultValue) : null
  const typed = (part: (typeof PARTS)[number]['part']) => {
    const value = form?.values?.[`${name}-${part}`]
    return typeof value === 'string' ? value : parts ? String(parts[part]) : ''
  }
  return (
    <Field state={state} label={legend} hint={hint} optional={optional} group>
      <div className="flex flex-wrap gap-4">
        {PARTS.map(({ part, label, width }) => {
          const id = part === 'day' ? state.id : `${state.id}-${part}`
          const isWrong =
            state.problem !== undefined && (own === undefined || own.field === `${name}-${part}`)
          return (
            <div key={part}>
              <label htmlFor={id} className="block text-sm text-slate">
                {label}
              </label>
              <input
                id={id}
                name={`${name}-${part}`}
                defaultValue={typed(part)}
                inputMode={part === 'month' ? 'text' : 'numeric'}
                autoComplete="off"
                spellCheck={false}
                aria-invalid={isWrong ? true : undefined}
                className={controlClass(isWrong ? state.problem : undefined, `tabular ${width}`)}
              />
            </div>
          )
        })}
      </div>
    </Field>
  )
}
