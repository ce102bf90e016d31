import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { AsideNotes, HomeFormPage } from '@/components/homes/home-form-page'
import { HomeIdentityForm } from '@/components/homes/home-identity-form'
import { patchChoices } from '../../new/patch-choices'
import { change } from '../actions'
import { readHomeToEdit } from '../read-home'

export const metadata: Metadata = { title: 'Change address and tenure' }

export default async function IdentityPage({ params }: { params: Promise<{ homeId: string }> }) {
  const { home, note } = await readHomeToEdit((await params).homeId)
  const patches = await patchChoices(await requireActor())
  return (
    <HomeFormPage
      home={home}
      title="Change address and tenure"
      aside={
        <AsideNotes
          title="What follows"
          lines={[
            'Nation and tenure set which law the inspection follows: its date is counted anew.',
            'Moving a home to another patch moves it to whoever answers for that patch.',
            'What changed, and who changed it, goes into the audit trail.',
          ]}
        />
      }
    >
      <HomeIdentityForm home={home} note={note} patches={patches} action={change} />
    </HomeFormPage>
  )
}
