import { type ReactNode } from 'react'
import { classNames } from '@/components/ui/class-names'

type Props = {
  id: string
  title: string
  sub?: ReactNode
  actions?: ReactNode
  children: ReactNode
  className?: string
}

/** A part of a home's page that holds a table or a list of its own. */
export function HomeSection({ id, title, sub, actions, children, className }: Props) {
  return (
    <section id={id} aria-labelledby={`${id}-title`} className={classNames('min-w-0', className)}>
      <div className="mb-3 flex flex-wrap items-end justify-between gap-x-4 gap-y-2 print:mb-1">
        <div className="min-w-0">
          <h2 id={`${id}-title`} className="text-xl">
            {title}
          </h2>
          {sub && <p className="text-sm text-slate">{sub}</p>}
        </div>
        {actions}
      </div>
      {children}
    </section>
  )
}

/** Where a part has nothing to show: what is so, and what to do first. */
export function NothingYet({ children, action }: { children: ReactNode; action?: ReactNode }) {
  return (
    <div className="border border-dashed border-edge bg-surface p-4 sm:p-5">
      <p className="max-w-reading text-slate">{children}</p>
      {action && <div className="mt-3">{action}</div>}
    </div>
  )
}
