import { type ReactNode } from 'react'
import { classNames } from './class-names'

type Props = {
  title?: ReactNode
  /** the level of the title's heading */
  level?: 2 | 3
  sub?: ReactNode
  actions?: ReactNode
  children?: ReactNode
  className?: string
  id?: string
}

/** A part of a page on its own ground, with a heading of its own. */
export function Card({ title, level = 2, sub, actions, children, className, id }: Props) {
  const Heading = `h${level}` as const
  return (
    <section
      id={id}
      aria-labelledby={title && id ? `${id}-title` : undefined}
      className={classNames('card min-w-0 border border-line bg-surface p-4 sm:p-5', className)}
    >
      {(title || actions) && (
        <div className="mb-4 flex flex-wrap items-start justify-between gap-x-4 gap-y-2">
          <div className="min-w-0">
            {title && (
              <Heading id={id ? `${id}-title` : undefined} className={level === 2 ? 'text-xl' : 'text-lg'}>
                {title}
              </Heading>
            )}
            {sub && <p className="mt-0.5 text-sm text-slate">{sub}</p>}
          </div>
          {actions}
        </div>
      )}
      {children}
    </section>
  )
}
