import { type Metadata } from 'next'
import { HomeFactsForm } from '@/components/homes/home-facts-form'
import { AsideNotes, HomeFormPage } from '@/components/homes/home-form-page'
import { correctFacts } from '../actions'
import { readHomeToEdit } from '../read-home'

export const metadata: Metadata = { title: 'Correct facts' }

export default async function FactsPage({ params }: { params: Promise<{ homeId: string }> }) {
  const { home, facts } = await readHomeToEdit((await params).homeId)
  return (
    <HomeFormPage
      home={home}
      title="Correct facts"
      aside={
        <AsideNotes
          title="What follows"
          lines={[
            'Only what you change is recorded, with your name and the date. What it was before stays as history.',
            '“Not known” is an answer. It is better than a guess: what is not known widens the range of the score.',
            'The ways of a board bring its type and RCD cover with them.',
            'The score is made anew at once, and the home moves in the ranking.',
          ]}
        />
      }
    >
      <HomeFactsForm homeId={home.id} facts={facts} action={correctFacts} />
    </HomeFormPage>
  )
}
