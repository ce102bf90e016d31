import { notFound } from 'next/navigation'
import { OfficeShell } from './shell'
import { shownOf } from './made-up'
import { HomeScreen } from '@/components/homes/home-screen'
import { HomeFactsForm } from '@/components/homes/home-facts-form'
import { HomeInspectionForm } from '@/components/homes/home-inspection-form'
import { HomeDefectForm } from '@/components/homes/home-defect-form'
import { HomeIdentityForm } from '@/components/homes/home-identity-form'
import { HomeAddForm } from '@/components/homes/home-add-form'
import { AsideNotes, HomeFormPage } from '@/components/homes/home-form-page'
import Loading from '@/app/(office)/homes/[homeId]/loading'
import NotFoundPage from '@/app/(office)/homes/[homeId]/not-found'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type FormState } from '@/lib/forms/form-state'

async function refuse(state: FormState, form: FormData): Promise<FormState> {
  'use server'
  const values = Object.fromEntries([...form.entries()].filter(([name]) => !name.startsWith('$')).map(([k, v]) => [k, String(v)]))
  return { status: 'refused', problems: [{ field: 'board-type', problem: 'The ways that you give make this board “Rewireable fuses”. Change one of the two.' }, {field:'uprn',problem:'Another home in the register has this UPRN already.'}, {field:'closedOn',problem:'That date cannot lie in the future.'}], message: null, link: null, values, result: null }
}
const today = '2026-12-01' as CalendarDay
export default async function Page({ params }: { params: Promise<{ what: string }> }) {
  const { what } = await params
  const shown = shownOf(what)
  const aside = <AsideNotes title="What follows" lines={['Only what you change is recorded, with your name and the date. What it was before stays as history.', '“Not known” is an answer. It is better than a guess.']} />
  const page = (title: string, child: React.ReactNode) => <HomeFormPage home={shown.home} title={title} aside={aside}>{child}</HomeFormPage>
  const patches = [{ value: 'none', label: 'In no patch' }, { value: 'p1', label: 'Ferry Bank' }]
  const screens: Record<string, React.ReactNode> = {
    facts: page('Correct facts', <HomeFactsForm homeId="h" facts={shown.facts} action={refuse} />),
    inspection: page('Record an inspection', <HomeInspectionForm homeId="h" action={refuse} />),
    defect: page('Add a defect', <HomeDefectForm homeId="h" action={refuse} />),
    identity: page('Change address and tenure', <HomeIdentityForm home={shown.home} note={shown.note} patches={patches} action={refuse} />),
    new: page('Add a home', <HomeAddForm patches={patches} action={refuse} />),
    loading: <Loading />,
    missing: <NotFoundPage />,
  }
  if (what === 'none') notFound()
  return <OfficeShell>{screens[what] ?? <HomeScreen shown={shown} today={today} said={what === 'said' ? 'The defect is closed. It stays on record with its note.' : null} closeDefect={refuse} />}</OfficeShell>
}
