import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { TodayScreen } from '@/components/today/today-screen'
import { today } from '@/lib/platform/clock'
import { showToday } from '@/lib/use-cases/today/show-today'

export const metadata: Metadata = { title: 'Today' }

export default async function TodayPage() {
  const actor = await requireActor()
  const day = today()
  return <TodayScreen today={day} shown={await show(showToday(actor, day))} />
}
