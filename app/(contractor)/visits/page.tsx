import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { VisitsScreen } from '@/components/people/visits-screen'
import { listVisits } from '@/lib/use-cases/people/list-visits'

export const metadata: Metadata = { title: 'Visits' }

export default async function VisitsPage() {
  const actor = await requireActor()
  const { organisationName } = await show(listVisits(actor))
  return <VisitsScreen organisationName={organisationName} />
}
