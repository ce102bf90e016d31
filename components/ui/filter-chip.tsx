import Link from 'next/link'
import { type ReactNode } from 'react'
import { classNames } from './class-names'

/** The look of a chip, for links and for the triggers of menus alike. */
export const chipClass = (active: boolean): string =>
  classNames(
    'no-print inline-flex min-h-8 items-center gap-1.5 rounded-full border px-3 py-1 text-sm',
    active
      ? 'border-copper bg-copper-wash font-semibold text-copper hover:bg-surface'
      : 'border-edge bg-surface text-ink hover:border-ink',
  )

/** A filter that is on: the link takes it off. */
export function FilterChip({ href, children }: { href: string; children: ReactNode }) {
  return (
    <Link href={href} scroll={false} className={chipClass(true)}>
      <span className="sr-only">Take off the filter </span>
      {children}
      <span aria-hidden="true">✕</span>
    </Link>
  )
}

/** A link that turns a filter on, or shows that it is. */
export function ChipLink({ href, active, children }: { href: string; active: boolean; children: ReactNode }) {
  return (
    <Link href={href} scroll={false} aria-current={active ? 'true' : undefined} className={chipClass(active)}>
      {children}
    </Link>
  )
}
