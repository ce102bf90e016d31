import Link from 'next/link'
import { classNames } from './class-names'
import { type Segment } from './segmented-links'

/** The parts of one large thing, such as an import: each tab is a page with an address of its own. */
export function TabLinks({ label, tabs }: { label: string; tabs: readonly Segment[] }) {
  return (
    <nav aria-label={label} className="no-print overflow-x-auto border-b border-line">
      <ul className="flex gap-6">
        {tabs.map(({ href, label: text, current, count }) => (
          <li key={href}>
            <Link
              href={href}
              aria-current={current ? 'page' : undefined}
              className={classNames(
                '-mb-px flex min-h-control items-center gap-1.5 border-b-[3px] whitespace-nowrap -outline-offset-2',
                current
                  ? 'border-copper font-semibold text-ink'
                  : 'border-transparent text-slate hover:text-ink',
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
