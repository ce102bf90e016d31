import { type ReactNode } from 'react'
import { classNames } from './class-names'
import { type FieldState } from './form-context'

type Props = {
  state: FieldState
  label: ReactNode
  hint?: ReactNode
  optional?: boolean
  /** a fieldset with a legend, for a group of controls */
  group?: boolean
  children: ReactNode
}

/** The look of every control that is typed into or chosen from; its width is the caller's. */
export const controlClass = (problem: string | undefined, extra?: string): string =>
  classNames(
    'block min-h-control rounded-control border bg-surface px-3 py-2 text-base text-ink disabled:bg-sunken disabled:text-slate',
    problem ? 'border-2 border-madder' : 'border-edge hover:border-ink',
    extra,
  )

/** The frame of a field: label above, then hint, then what is wrong, then the control. */
export function Field({ state, label, hint, optional, group, children }: Props) {
  const caption = (
    <>
      {label}
      {optional && <span className="font-normal text-slate"> (optional)</span>}
    </>
  )
  const below = (
    <>
      {hint && (
        <p id={state.hintId} className="mt-0.5 text-sm text-slate">
          {hint}
        </p>
      )}
      {state.problem && (
        <p id={state.problemId} className="mt-1 flex items-baseline gap-2 font-semibold text-madder">
          <svg viewBox="0 0 10 10" className="size-2.5 shrink-0" aria-hidden="true">
            <rect width="10" height="10" fill="currentColor" />
          </svg>
          <span>
            <span className="sr-only">Error: </span>
            {state.problem}
          </span>
        </p>
      )}
      <div className="mt-1.5">{children}</div>
    </>
  )
  const frame = classNames('mb-6 min-w-0', state.problem && 'border-l-4 border-madder pl-4')
  if (group) {
    return (
      <fieldset className={frame} aria-describedby={state.describedBy}>
        <legend className="float-left w-full font-semibold text-ink">{caption}</legend>
        <div className="clear-both">{below}</div>
      </fieldset>
    )
  }
  return (
    <div className={frame}>
      <label htmlFor={state.id} className="block font-semibold text-ink">
        {caption}
      </label>
      {below}
    </div>
  )
}
