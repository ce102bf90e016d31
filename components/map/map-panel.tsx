'use client'
import { keepPreviousData, useQuery } from '@tanstack/react-query'
import dynamic from 'next/dynamic'
import { useRouter } from 'next/navigation'
import { useCallback, useEffect, useMemo, useRef, useState, useTransition } from 'react'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { Skeleton } from '@/components/ui/skeleton'
import { listAddress } from '@/lib/homes/filter-names'
import { type HomeQuery, homeQueryText } from '@/lib/homes/home-query'
import { MOST_MARKERS } from './feature-words'
import { type Box, type HomesOnMap } from './homes-on-map'
import { InView } from './in-view'
import { type Goal, type Tiles, type View } from './map-sheet'
import { NothingPlaced } from './nothing-placed'

const MapSheet = dynamic(() => import('./map-sheet'), {
  ssr: false,
  loading: () => <Skeleton className="size-full" />,
})

/** How long a hand may rest before the address of the page follows the map [ms]. */
const REST = 400
const WORLD: View = { box: [-180, -85, 180, 85], zoom: 0 }

async function fetchHomes(text: string): Promise<HomesOnMap> {
  const response = await fetch(`/api/v1/map?${text}`)
  if (!response.ok) throw new Error(`The homes did not come: ${response.status}`)
  return (await response.json()) as HomesOnMap
}

const whole = (n: number) => n.toLocaleString('en-GB')

/** The map of a query's homes: fetched for the part on screen, the old ones kept until the new are there. */
export function MapPanel({ query, tiles }: { query: HomeQuery; tiles: Tiles | null }) {
  const router = useRouter()
  const [, startTransition] = useTransition()
  const [view, setView] = useState<View>(WORLD)
  // where a person's own hand has put the map, as the address has it or will have it in a moment
  const [own, setOwn] = useState<readonly string[]>([])
  const [asked, setAsked] = useState<Goal | null>(null)
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined)

  // the filter without what only the list needs
  const filter = homeQueryText({
    ...query,
    within: undefined,
    after: undefined,
    sort: 'score',
    order: 'desc',
  })
  const text = `${filter ? `${filter}&` : ''}box=${view.box.join()}&zoom=${view.zoom}`
  const { data, error, isFetching, refetch } = useQuery({
    queryKey: ['map', text],
    queryFn: () => fetchHomes(text),
    placeholderData: keepPreviousData,
  })

  // where somebody asked to go; else the area of the address, unless a hand left the map there; else all homes
  const within = query.within?.join()
  const at = `${filter} ${within ?? ''}`
  const [seen, setSeen] = useState(at)
  if (seen !== at) {
    setSeen(at)
    setAsked(null)
  }
  const target = within === undefined ? data?.extent?.join() : own.includes(within) ? undefined : within
  const derived = useMemo<Goal | null>(
    () =>
      target === undefined ? null : { box: target.split(',').map(Number) as unknown as Box, silent: true },
    [target],
  )
  const goal = asked ?? derived

  const onView = useCallback(
    (next: View, byHand: boolean) => {
      setView(next)
      clearTimeout(timer.current)
      if (!byHand) return
      timer.current = setTimeout(() => {
        setOwn((before) => [...before.slice(-20), next.box.join()])
        startTransition(() =>
          router.replace(listAddress(query, { within: [...next.box] }, '/map'), { scroll: false }),
        )
      }, REST)
    },
    [query, router],
  )
  useEffect(() => () => clearTimeout(timer.current), [])
  const listHref = useCallback(
    ([west, south, east, north]: Box) =>
      listAddress(
        query,
        { within: [west - 0.00002, south - 0.00002, east + 0.00002, north + 0.00002] },
        '/map',
      ),
    [query],
  )
  const showAll = () => {
    clearTimeout(timer.current)
    setOwn([])
    if (within === undefined && data?.extent) setAsked({ box: data.extent, silent: true })
    startTransition(() =>
      router.replace(listAddress(query, { within: undefined }, '/map'), { scroll: false }),
    )
  }
  const line = useMemo(() => countLine(data), [data])
  if (data && data.placed === 0) return <NothingPlaced unplaced={data.unplaced} />

  const features = (data?.points.length ?? 0) + (data?.clusters.length ?? 0)
  return (
    <section aria-label="Map" className="flex flex-col gap-2">
      <div className="flex min-h-6 flex-wrap justify-between gap-x-4 text-sm text-slate">
        <p role="status" className="tabular-nums">
          {line}
          {features > MOST_MARKERS && ' So many are drawn as dots; zoom in for their boards.'}
        </p>
        <p aria-hidden="true">{isFetching ? 'Loading homes…' : ''}</p>
      </div>
      {error && (
        <Notice
          tone="madder"
          title="The homes on the map did not load"
          announce
          actions={
            <Button kind="secondary" size="compact" onClick={() => void refetch()}>
              Try again
            </Button>
          }
        >
          The table below is up to date. {data ? 'The map still shows what it showed before.' : ''}
        </Notice>
      )}
      <div className="relative isolate h-[26rem] border border-line bg-sunken md:h-[34rem]">
        <MapSheet
          homes={data}
          goal={goal}
          tiles={tiles}
          onView={onView}
          onShowAll={showAll}
          listHref={listHref}
        />
      </div>
      {data && <InView homes={data} onCluster={(box) => setAsked({ box, silent: false })} />}
    </section>
  )
}

function countLine(homes: HomesOnMap | undefined): string {
  if (!homes) return 'Loading homes…'
  const missing =
    homes.unplaced === 0
      ? ''
      : homes.unplaced === 1
        ? '; 1 has no place yet'
        : `; ${whole(homes.unplaced)} have no place yet`
  return `Showing ${whole(homes.inBox)} of ${whole(homes.placed)} homes with a place${missing}.`
}
