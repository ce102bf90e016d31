import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { MapScreen } from '@/components/map/map-screen'
import { can } from '@/lib/access/can'
import { placeChoices } from '@/lib/homes/filter-names'
import { homeQueryOf } from '@/lib/homes/home-query'
import { today } from '@/lib/platform/clock'
import { env } from '@/lib/platform/env'
import { filterChoices } from '@/lib/use-cases/homes/filter-choices'
import { listHomes } from '@/lib/use-cases/homes/list-homes'

export const metadata: Metadata = { title: 'Map' }

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> }

export default async function MapPage({ searchParams }: Props) {
  const actor = await requireActor()
  const day = today()
  const query = homeQueryOf(await searchParams)
  const [list, choices] = await show(Promise.all([listHomes(actor, query, day), filterChoices(actor, day)]))
  const { TILE_URL, TILE_ATTRIBUTION } = env()
  return (
    <MapScreen
      query={query}
      list={list}
      {...placeChoices(choices)}
      tiles={TILE_URL ? { url: TILE_URL, attribution: TILE_ATTRIBUTION ?? '' } : null}
      today={day}
      mayImport={can(actor, 'imports.run')}
    />
  )
}
