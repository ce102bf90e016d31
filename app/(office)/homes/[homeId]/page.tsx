import { type Metadata } from 'next'
import { HomeScreen } from '@/components/homes/home-screen'
import { today } from '@/lib/platform/clock'
import { close } from './actions'
import { readHome } from './read-home'
import { saidOf } from './said'

type Props = {
  params: Promise<{ homeId: string }>
  searchParams: Promise<Record<string, string | string[] | undefined>>
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { home } = await readHome((await params).homeId)
  return { title: [home.address, home.postcode].filter(Boolean).join(', ') }
}

export default async function HomePage({ params, searchParams }: Props) {
  const shown = await readHome((await params).homeId)
  const said = saidOf((await searchParams).said)
  return <HomeScreen shown={shown} today={today()} said={said} closeDefect={close} />
}
