import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { ListScreen } from '@/components/homes/list-screen'
import { can } from '@/lib/access/can'
import { homeQueryOf } from '@/lib/homes/home-query'
import { today } from '@/lib/platform/clock'
import { countRewireableByPatch } from '@/lib/use-cases/homes/count-rewireable'
import { filterChoices } from '@/lib/use-cases/homes/filter-choices'
import { listHomes } from '@/lib/use-cases/homes/list-homes'

export const metadata: Metadata = { title: 'Homes' }

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> }

export default async function HomesPage({ searchParams }: Props) {
  const actor = await requireActor()
  const day = today()
  const query = homeQueryOf(await searchParams)
  const asksRewireable = query.board.includes('rewireable-ways')
  const [list, choices, byPatch] = await show(
    Promise.all([
      listHomes(actor, query, day),
      filterChoices(actor, day),
      asksRewireable ? countRewireableByPatch(actor, day) : null,
    ]),
  )
  const asChoice = ({ id, name, homes }: { id: string; name: string; homes: number }) => ({
    value: id,
    label: name,
    homes,
  })
  const noPatch =
    choices.inNoPatch > 0 ? [{ value: 'none', label: 'In no patch', homes: choices.inNoPatch }] : []
  return (
    <ListScreen
      query={query}
      list={list}
      patches={[...choices.patches.map(asChoice), ...noPatch]}
      blocks={choices.blocks.map(asChoice)}
      byPatch={byPatch?.patches ?? null}
      today={day}
      may={{
        run: can(actor, 'imports.run'),
        add: can(actor, 'homes.add'),
        export: can(actor, 'homes.export'),
      }}
    />
  )
}
