import Link from 'next/link'
import { type ReactNode } from 'react'

type Props = {
  value: number | string
  /** what is counted */
  label: ReactNode
  /** the list behind the figure */
  href?: string
  note?: ReactNode
  tone?: 'ink' | 'madder' | 'copper' | 'verdigris'
}

const TONES = { ink: 'text-ink', madder: 'text-madder', copper: 'text-copper', verdigris: 'text-verdigris' }

/** A large number with what it counts under it. */
export function Figure({ value, label, href, note, tone = 'ink' }: Props) {
  const number = typeof value === 'number' ? value.toLocaleString('en-GB') : value
  return (
    <div className="min-w-0">
      <p className={`font-display text-4xl font-bold tracking-tight tabular-nums ${TONES[tone]}`}>{number}</p>
      <p className="mt-1">
        {href ? (
          <Link href={href} className="link-block link">
            <span className="sr-only">{number} </span>
            {label}
          </Link>
        ) : (
          label
        )}
      </p>
      {note && <p className="text-sm text-slate">{note}</p>}
    </div>
  )
}
