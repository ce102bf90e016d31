import { type ReactNode } from 'react'

type Props = {
  /** what the page says, not what it is called: "311 homes have no report in date" */
  title: ReactNode
  sub?: ReactNode
  actions?: ReactNode
  /** a breadcrumb, above */
  above?: ReactNode
  /** badges, below */
  children?: ReactNode
}

/** The head of a page: its one first-level heading, a line under it, and what can be done. */
export function PageHeader({ title, sub, actions, above, children }: Props) {
  return (
    <header className="pt-6 pb-4 sm:pt-8">
      {above}
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
        <div className="min-w-0">
          <h1 className="text-2xl sm:text-3xl">{title}</h1>
          {sub && <p className="mt-1 max-w-reading text-slate">{sub}</p>}
        </div>
        {actions && <div className="no-print flex flex-wrap gap-3">{actions}</div>}
      </div>
      {children && <div className="mt-4 flex flex-wrap items-center gap-2">{children}</div>}
    </header>
  )
}
