import Link from 'next/link'
import { type ReactNode } from 'react'
import { buttonClass } from './button-class'

type Props = {
  /** names what is paged: "Homes" */
  label: string
  /** null on the first page */
  firstHref?: string | null
  backHref?: string | null
  nextHref: string | null
  /** where in the whole: "1 to 50 of 2,412" */
  children?: ReactNode
}

/** Next and back through a long list that is read on from where the page before ended. */
export function Pagination({ label, firstHref, backHref, nextHref, children }: Props) {
  const quiet = buttonClass('secondary', 'compact')
  return (
    <nav
      aria-label={`Pages of ${label}`}
      className="no-print flex flex-wrap items-center justify-between gap-4 py-4"
    >
      <p className="text-sm text-slate tabular-nums">{children}</p>
      <div className="flex flex-wrap gap-2">
        {firstHref && (
          <Link href={firstHref} className={quiet}>
            Back to the start
          </Link>
        )}
        {backHref && (
          <Link href={backHref} rel="prev" className={quiet}>
            <span aria-hidden="true">←</span> Back
          </Link>
        )}
        {nextHref && (
          <Link href={nextHref} rel="next" className={quiet}>
            Next <span aria-hidden="true">→</span>
          </Link>
        )}
      </div>
    </nav>
  )
}
