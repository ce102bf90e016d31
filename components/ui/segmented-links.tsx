import Link from 'next/link'
import { type ReactNode } from 'react'
import { classNames } from './class-names'

export type Segment = {
  readonly href: string
  readonly label: ReactNode
  readonly current: boolean
  readonly count?: number
}

/** A few views of one thing, one of them shown: each is a link, so that each has an address. */
export function SegmentedLinks({ label, segments }: { label: string; segments: readonly Segment[] }) {
  return (
    <nav aria-label={label} className="no-print max-w-full">
      <ul className="inline-flex max-w-full flex-wrap gap-px overflow-hidden rounded-control border border-edge bg-line">
        {segments.map(({ href, label: text, current, count }) => (
          <li key={href} className="flex flex-1">
            <Link
              href={href}
              aria-current={current ? 'page' : undefined}
              className={classNames(
                'flex min-h-9 w-full items-center justify-center gap-1.5 px-3 py-1 whitespace-nowrap -outline-offset-2',
                current ? 'bg-copper-wash font-semibold text-copper' : 'bg-surface text-ink hover:bg-sunken',
              )}
            >
              {text}
              {count !== undefined && (
                <span className="text-sm text-slate tabular-nums">{count.toLocaleString('en-GB')}</span>
              )}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  )
}
