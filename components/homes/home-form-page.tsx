import { type ReactNode } from 'react'
import { Breadcrumb } from '@/components/ui/breadcrumb'
import { PageHeader } from '@/components/ui/page-header'
import { type HomeRow } from '@/lib/homes/home-row'
import { stepsTo } from './home-steps'

type Props = {
  home: Pick<HomeRow, 'id' | 'address' | 'town' | 'postcode' | 'patch'>
  title: string
  sub?: ReactNode
  /** what follows from the form, beside it */
  aside: ReactNode
  children: ReactNode
}

/** A form about one home, on a page of its own: which home it is, the form, and beside it what will follow. */
export function HomeFormPage({ home, title, sub, aside, children }: Props) {
  const where = [home.address, home.town, home.postcode].filter(Boolean).join(', ')
  return (
    <>
      <PageHeader
        title={title}
        sub={
          <>
            <span className="block font-semibold text-ink">{where}</span>
            {sub}
          </>
        }
        above={
          <Breadcrumb
            steps={[...stepsTo(home), { href: `/homes/${home.id}`, label: home.address }]}
            here={title}
          />
        }
      />
      <div className="grid gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <div className="min-w-0">{children}</div>
        <aside className="min-w-0 lg:sticky lg:top-6 lg:self-start lg:pt-1">{aside}</aside>
      </div>
    </>
  )
}

/** A few lines beside a form, under a heading. */
export function AsideNotes({ title, lines }: { title: string; lines: readonly ReactNode[] }) {
  return (
    <div className="border-t-2 border-copper pt-3">
      <h2 className="text-lg">{title}</h2>
      <ul className="mt-2 list-disc space-y-2 pl-5 text-slate">
        {lines.map((line, at) => (
          <li key={at}>{line}</li>
        ))}
      </ul>
    </div>
  )
}
