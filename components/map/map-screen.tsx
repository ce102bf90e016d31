import { ListFilters } from '@/components/homes/list-filters'
import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { PageHeader } from '@/components/ui/page-header'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type FilterChoice, FIXED_CHOICES } from '@/lib/homes/filter-names'
import { type HomeQuery } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { HomesInView } from './homes-in-view'
import { MapLegend } from './map-legend'
import { MapPanel } from './map-panel'
import { type Tiles } from './map-sheet'

type Props = {
  query: HomeQuery
  list: {
    readonly rows: readonly HomeRow[]
    readonly next: string | null
    readonly total: number
    readonly all: number
  }
  patches: readonly FilterChoice[]
  blocks: readonly FilterChoice[]
  tiles: Tiles | null
  today: CalendarDay
  mayImport: boolean
}

/** Where the homes are, what is on their walls, and the same as a table. */
export function MapScreen({ query, list, patches, blocks, tiles, today, mayImport }: Props) {
  if (list.all === 0)
    return (
      <>
        <PageHeader title="Map" />
        <EmptyState
          title="No homes to map yet"
          actions={mayImport && <ButtonLink href="/imports/new">Import a stock list</ButtonLink>}
        >
          {mayImport
            ? 'Bring the list of homes as you keep it. Homes with an easting and northing, or a latitude and longitude, are drawn at once.'
            : 'Homes appear here as soon as your compliance manager has brought them in, or given you a patch.'}
        </EmptyState>
      </>
    )
  return (
    <>
      <PageHeader
        title="Map"
        sub="Homes of the filter where they stand. The table below holds the same homes."
      />
      <div className="mb-3">
        <ListFilters
          query={query}
          choices={{ ...FIXED_CHOICES, patch: patches, block: blocks }}
          path="/map"
        />
      </div>
      <div className="flex flex-col gap-6">
        <MapPanel query={query} tiles={tiles} />
        <MapLegend />
        <HomesInView query={query} list={list} today={today} />
      </div>
    </>
  )
}
