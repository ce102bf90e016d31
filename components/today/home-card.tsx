import Link from 'next/link'
import { type ReactNode } from 'react'
import { classNames } from '@/components/ui/class-names'
import { type HomeRow } from '@/lib/homes/home-row'

const EDGES = { madder: 'border-l-madder', amber: 'border-l-amber', plain: 'border-l-edge' } as const

type Props = {
  home: Pick<HomeRow, 'id' | 'address' | 'postcode' | 'patch'>
  tone?: keyof typeof EDGES
  /** what is said of it */
  children: ReactNode
  /** what stands at the end of the line */
  aside: ReactNode
}

/** One home that wants something, in a list of such homes. */
export function HomeCard({ home, tone = 'plain', children, aside }: Props) {
  return (
    <li
      className={classNames(
        'flex items-center gap-4 border border-l-4 border-line bg-surface px-4 py-2.5',
        EDGES[tone],
      )}
    >
      <div className="min-w-0 flex-1">
        <Link
          href={`/homes/${home.id}`}
          prefetch={false}
          className="link-block font-semibold text-ink underline-offset-4 hover:text-copper hover:underline"
        >
          {home.address}
        </Link>
        <p className="text-sm text-slate">{[home.postcode, home.patch?.name].filter(Boolean).join(' · ')}</p>
      </div>
      <div className="text-sm">{children}</div>
      <div className="shrink-0">{aside}</div>
    </li>
  )
}
