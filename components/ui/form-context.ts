'use client'
import { createContext, useContext, useId } from 'react'
import { type FieldProblem } from '@/lib/errors/expected'

export type TypedValue = string | readonly string[] | undefined

/** What a form tells its fields: what is wrong with them, and what was typed. */
export type FormContextValue = {
  readonly id: string
  readonly problems: readonly FieldProblem[]
  /** null before the first try, and after one that went well */
  readonly values: Readonly<Record<string, TypedValue>> | null
  /** the form is on its way */
  readonly pending: boolean
}

export const FormContext = createContext<FormContextValue | null>(null)

/** The id of a field's control, which the summary of problems links to. */
export const fieldId = (formId: string, name: string): string =>
  `${formId}-${name.replaceAll(/[^\w-]/g, '-')}`

export type FieldState = {
  readonly id: string
  readonly hintId: string
  readonly problemId: string
  readonly problem: string | undefined
  /** what was typed the last time, as one text; undefined before the first try */
  readonly typed: string | undefined
  /** what was typed the last time, as a list; undefined before the first try */
  readonly typedList: readonly string[] | undefined
  /** for `aria-describedby` */
  readonly describedBy: string | undefined
}

/** A field's own part of its form; without a form around it (a search, a filter) it has no problems. */
export function useFieldState(name: string, hasHint: boolean, given?: string): FieldState {
  const form = useContext(FormContext)
  const loneId = useId()
  const id = fieldId(form?.id ?? loneId, name)
  const problem = given ?? form?.problems.find((one) => one.field === name)?.problem
  const value = form?.values ? form.values[name] : undefined
  const typedList = form?.values
    ? value === undefined
      ? []
      : typeof value === 'string'
        ? [value]
        : value
    : undefined
  const described = [hasHint && `${id}-hint`, problem && `${id}-problem`].filter(Boolean).join(' ')
  return {
    id,
    hintId: `${id}-hint`,
    problemId: `${id}-problem`,
    problem,
    typed: typedList?.[0],
    typedList,
    describedBy: described || undefined,
  }
}
