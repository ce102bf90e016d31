import { type Metadata } from 'next'
import { notFound } from 'next/navigation'
import { requireActor } from '@/app/session'
import { UploadForm } from '@/components/imports/upload-form'
import { Breadcrumb } from '@/components/ui/breadcrumb'
import { PageHeader } from '@/components/ui/page-header'
import { can } from '@/lib/access/can'

export const metadata: Metadata = { title: 'Import a stock list' }

export default async function NewImportPage() {
  const actor = await requireActor()
  if (!can(actor, 'imports.run')) notFound()
  return (
    <>
      <PageHeader
        title="Import a stock list"
        sub="The list as you keep it will do. Nothing is taken in before you have seen every problem and confirmed."
        above={<Breadcrumb steps={[{ href: '/imports', label: 'Imports' }]} here="New" />}
      />
      <div className="grid gap-10 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <UploadForm />
        <aside>
          <h2 className="text-lg">What helps</h2>
          <ul className="mt-2 list-disc space-y-2 pl-5 text-slate">
            <li>
              An address is all that a row must have. A UPRN or your own reference lets us know the home
              again.
            </li>
            <li>Dates as you write them: 3 August 2023, 03/08/2023, 3.8.23, Aug 2023 or just 2023.</li>
            <li>Boards in the words of the trade: rewireable, BS 3036, MCBs, RCBO, cartridge, mixed.</li>
            <li>“Not known” is a good answer. An empty cell never overwrites what the register knows.</li>
          </ul>
        </aside>
      </div>
    </>
  )
}
