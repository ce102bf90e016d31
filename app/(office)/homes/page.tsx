import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { ListScreen } from '@/components/homes/list-screen'
import { can } from '@/lib/access/can'
import { placeChoices } from '@/lib/homes/filter-names'
import { homeQueryOf } from '@/lib/homes/home-query'
import { today } from '@/lib/platform/clock'
import { filterChoices } from '@/lib/use-cases/homes/filter-choices'
import { listHomes } from '@/lib/use-cases/homes/list-homes'

export const metadata: Metadata = { title: 'Homes' }

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> }

export default async function HomesPage({ searchParams }: Props) {
  const actor = await requireActor()
  const day = today()
  const query = homeQueryOf(await searchParams)
  const asksRewireable = query.board.includes('rewireable-ways')
  const [list, choices] = await show(Promise.all([listHomes(actor, query, day), filterChoices(actor, day)]))
  return (
    <ListScreen
      query={query}
      list={list}
      {...placeChoices(choices)}
      byPatch={asksRewireable ? choices.byPatch : null}
      today={day}
      may={{
        run: can(actor, 'imports.run'),
        add: can(actor, 'homes.add'),
        export: can(actor, 'homes.export'),
      }}
    />
  )
}
