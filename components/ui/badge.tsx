import { type ReactNode } from 'react'
import { classNames } from './class-names'
import { StateMark, type Tone } from './state-mark'

const TONES: Record<Tone, string> = {
  madder: 'border-transparent bg-madder-wash text-madder',
  amber: 'border-transparent bg-amber-wash text-amber',
  verdigris: 'border-transparent bg-verdigris-wash text-verdigris',
  blueprint: 'border-dashed border-blueprint bg-surface text-blueprint',
  plain: 'border-line bg-surface text-ink',
}

/** A state as a word, a shape and a colour; the three always agree. */
export function Badge({
  tone,
  children,
  className,
}: {
  tone: Tone
  children: ReactNode
  className?: string
}) {
  return (
    <span
      className={classNames(
        'inline-flex items-center gap-1.5 rounded-plate border px-2 py-0.5 text-sm font-semibold',
        TONES[tone],
        className,
      )}
    >
      <StateMark tone={tone} />
      <span>{children}</span>
    </span>
  )
}
