import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { PeopleScreen } from '@/components/people/people-screen'
import { listPeople } from '@/lib/use-cases/people/list-people'
import { invite, resend, withdraw } from './actions'

export const metadata: Metadata = { title: 'People' }

export default async function PeoplePage() {
  const actor = await requireActor()
  const list = await show(listPeople(actor))
  return (
    <PeopleScreen
      {...list}
      organisationName={actor.organisationName}
      onInvite={invite}
      onResend={resend}
      onWithdraw={withdraw}
    />
  )
}
