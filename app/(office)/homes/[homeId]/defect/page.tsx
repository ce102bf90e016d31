import { type Metadata } from 'next'
import { HomeDefectForm } from '@/components/homes/home-defect-form'
import { AsideNotes, HomeFormPage } from '@/components/homes/home-form-page'
import { add } from '../actions'
import { readHomeToEdit } from '../read-home'

export const metadata: Metadata = { title: 'Add a defect' }

export default async function DefectPage({ params }: { params: Promise<{ homeId: string }> }) {
  const { home } = await readHomeToEdit((await params).homeId)
  return (
    <HomeFormPage
      home={home}
      title="Add a defect"
      aside={
        <AsideNotes
          title="If it is dangerous now"
          lines={[
            'Smoke, burning, shocks: the people at home switch off at the main switch if they can do it safely, keep away, and in a fire leave and call 999.',
            'A form is no call. Ring whoever is on duty first, then put it on record here.',
            'The code is the inspector’s. Where nobody has inspected it yet, ask an electrician before you choose one.',
          ]}
        />
      }
    >
      <HomeDefectForm homeId={home.id} action={add} />
    </HomeFormPage>
  )
}
