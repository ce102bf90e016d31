import { type ReactNode } from 'react'

type Props = {
  /** what is so: "No homes yet" */
  title: ReactNode
  /** what to do first, in a sentence or two */
  children: ReactNode
  actions?: ReactNode
  drawing?: ReactNode
  level?: 2 | 3
}

/** Says what to do first, where there is nothing to show. */
export function EmptyState({ title, children, actions, drawing, level = 2 }: Props) {
  const Heading = `h${level}` as const
  return (
    <div className="border border-dashed border-edge bg-surface px-5 py-8 sm:px-8 sm:py-10">
      {drawing && <div className="mb-5">{drawing}</div>}
      <Heading className="text-xl">{title}</Heading>
      <div className="mt-2 max-w-reading text-slate">{children}</div>
      {actions && <div className="mt-5 flex flex-wrap gap-3">{actions}</div>}
    </div>
  )
}
