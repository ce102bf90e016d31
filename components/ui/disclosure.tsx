import { type ReactNode } from 'react'
import { classNames } from './class-names'

type Props = { summary: ReactNode; children: ReactNode; open?: boolean; className?: string }

/** More, for those who want it. Works without any script, and prints open. */
export function Disclosure({ summary, children, open, className }: Props) {
  return (
    <details open={open} className={classNames('group', className)}>
      <summary className="link-block list-none gap-2 link">
        <svg
          viewBox="0 0 10 10"
          className="size-2.5 shrink-0 transition-transform group-open:rotate-90"
          aria-hidden="true"
        >
          <path d="M2 0 9 5 2 10Z" fill="currentColor" />
        </svg>
        {summary}
      </summary>
      <div className="mt-3">{children}</div>
    </details>
  )
}
