import { type ComponentProps, type ReactNode } from 'react'

type Props = Omit<ComponentProps<'input'>, 'type'> & {
  type: 'checkbox' | 'radio'
  id: string
  label: ReactNode
  hint?: ReactNode
}

/** A box or a button to pick, with its words beside it: the whole row is the target. */
export function ChoiceRow({ type, id, label, hint, ...rest }: Props) {
  const hintId = hint ? `${id}-hint` : undefined
  return (
    <div className="relative flex min-h-control items-start gap-3 py-1.5">
      <input
        {...rest}
        type={type}
        id={id}
        aria-describedby={[hintId, rest['aria-describedby']].filter(Boolean).join(' ') || undefined}
        className="mt-0.5 size-6 shrink-0"
      />
      <div className="min-w-0">
        <label htmlFor={id} className="block pt-0.5 before:absolute before:inset-0">
          {label}
        </label>
        {hint && (
          <p id={hintId} className="text-sm text-slate">
            {hint}
          </p>
        )}
      </div>
    </div>
  )
}
