import { type ReactNode } from 'react'
import { classNames } from './class-names'
import { StateMark, type Tone } from './state-mark'

const TONES: Record<Tone, readonly [ground: string, mark: string]> = {
  madder: ['border-madder bg-madder-wash', 'text-madder'],
  amber: ['border-amber bg-amber-wash', 'text-amber'],
  verdigris: ['border-verdigris bg-verdigris-wash', 'text-verdigris'],
  blueprint: ['border-blueprint bg-blueprint-wash', 'text-blueprint'],
  plain: ['border-copper bg-copper-wash', 'text-copper'],
}

type Props = {
  tone?: Tone
  title?: ReactNode
  children?: ReactNode
  actions?: ReactNode
  /** read out at once; for what has just happened */
  announce?: boolean
  className?: string
}

/** A few words that belong above or beside the rest: what has happened, what to know. */
export function Notice({ tone = 'blueprint', title, children, actions, announce, className }: Props) {
  const [ground, mark] = TONES[tone]
  return (
    <div
      role={announce ? (tone === 'madder' ? 'alert' : 'status') : undefined}
      className={classNames('card flex gap-3 rounded-plate border-l-4 px-4 py-3 text-ink', ground, className)}
    >
      <StateMark tone={tone} className={classNames('mt-1.5', mark)} />
      <div className="min-w-0 flex-1">
        {title && <p className="font-semibold">{title}</p>}
        {children && <div>{children}</div>}
        {actions && <div className="mt-3 flex flex-wrap gap-3">{actions}</div>}
      </div>
    </div>
  )
}
