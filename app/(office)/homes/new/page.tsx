import { type Metadata } from 'next'
import { notFound } from 'next/navigation'
import { requireActor } from '@/app/session'
import { HomeAddForm } from '@/components/homes/home-add-form'
import { AsideNotes } from '@/components/homes/home-form-page'
import { Breadcrumb } from '@/components/ui/breadcrumb'
import { PageHeader } from '@/components/ui/page-header'
import { can } from '@/lib/access/can'
import { add } from './actions'
import { patchChoices } from './patch-choices'

export const metadata: Metadata = { title: 'Add a home' }

export default async function NewHomePage() {
  const actor = await requireActor()
  if (!can(actor, 'homes.add')) notFound()
  return (
    <>
      <PageHeader
        title="Add a home"
        sub="An address and a nation are enough to begin. The rest can follow, and “not known” is an answer."
        above={<Breadcrumb steps={[{ href: '/homes', label: 'Homes' }]} here="Add a home" />}
      />
      <div className="grid gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <div className="min-w-0">
          <HomeAddForm patches={await patchChoices(actor)} action={add} />
        </div>
        <aside className="min-w-0 lg:sticky lg:top-6 lg:self-start lg:pt-1">
          <AsideNotes
            title="What helps"
            lines={[
              'The last report answers most of this: its date, the board, the RCD.',
              'A photograph of the open flap answers the rest. Nobody has to take anything apart.',
              'What you leave open is averaged over what it could be, and the home’s page says what to find out next.',
              'More than a handful of homes? Import them as a list instead.',
            ]}
          />
        </aside>
      </div>
    </>
  )
}
