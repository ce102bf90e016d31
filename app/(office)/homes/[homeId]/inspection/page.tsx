import { type Metadata } from 'next'
import { AsideNotes, HomeFormPage } from '@/components/homes/home-form-page'
import { HomeInspectionForm } from '@/components/homes/home-inspection-form'
import { record } from '../actions'
import { readHomeToEdit } from '../read-home'

export const metadata: Metadata = { title: 'Record an inspection' }

export default async function InspectionPage({ params }: { params: Promise<{ homeId: string }> }) {
  const { home, standing } = await readHomeToEdit((await params).homeId)
  return (
    <HomeFormPage
      home={home}
      title="Record an inspection"
      sub="From the report: what it says, not what it should have said."
      aside={
        <AsideNotes
          title="What follows"
          lines={[
            `The home’s standing is counted anew: ${standing.rule.years} years at most by ${standing.citation}, or sooner where the report says so.`,
            'Each C1, C2, C3 and FI goes on record as an open defect. Describe them one by one afterwards, if you like.',
            'The codes are the inspector’s. Copy them as they are, even where you would have given others.',
          ]}
        />
      }
    >
      <HomeInspectionForm homeId={home.id} action={record} />
    </HomeFormPage>
  )
}
