import { type ReactNode } from 'react'

export type Definition = {
  readonly term: string
  readonly value: ReactNode
  readonly note?: ReactNode
  readonly action?: ReactNode
}

/** Terms and what they are for this thing, one a line, with a note of where each comes from. */
export function DefinitionList({ items }: { items: readonly Definition[] }) {
  return (
    <dl className="divide-y divide-line border-y border-line">
      {items.map(({ term, value, note, action }) => (
        <div key={term} className="flex flex-wrap items-baseline gap-x-4 gap-y-0.5 py-2.5">
          <dt className="w-40 shrink-0 text-slate">{term}</dt>
          <dd className="min-w-40 flex-1">
            <span className="font-semibold">{value}</span>
            {note && <span className="block text-sm text-slate">{note}</span>}
          </dd>
          {action && <dd className="no-print">{action}</dd>}
        </div>
      ))}
    </dl>
  )
}
