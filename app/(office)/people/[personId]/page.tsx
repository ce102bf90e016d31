import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { PersonScreen } from '@/components/people/person-screen'
import { showPerson } from '@/lib/use-cases/people/show-person'
import { change, end } from './actions'

export const metadata: Metadata = { title: 'Change access' }

type Props = { params: Promise<{ personId: string }> }

export default async function PersonPage({ params }: Props) {
  const actor = await requireActor()
  const shown = await show(showPerson(actor, await params))
  return <PersonScreen {...shown} onChange={change} onEnd={end} />
}
