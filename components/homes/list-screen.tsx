import { ButtonLink } from '@/components/ui/button-link'
import { Disclosure } from '@/components/ui/disclosure'
import { EmptyState } from '@/components/ui/empty-state'
import { ChipLink } from '@/components/ui/filter-chip'
import { Menu, MenuLabel } from '@/components/ui/menu'
import { PageHeader } from '@/components/ui/page-header'
import { Pagination } from '@/components/ui/pagination'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type FilterChoice, filtersOn, FIXED_CHOICES, listAddress } from '@/lib/homes/filter-names'
import { type HomeQuery, homeQueryText, type Sort } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { ListColumns } from './list-columns'
import { ExportLink } from './export-link'
import { ListFilters } from './list-filters'
import { ListTable } from './list-table'
import { RewireableByPatch } from './rewireable-by-patch'

type PatchCount = Parameters<typeof RewireableByPatch>[0]['patches'][number]
type Props = {
  query: HomeQuery
  list: {
    readonly rows: readonly HomeRow[]
    readonly next: string | null
    readonly total: number
    readonly all: number
    readonly answer: { readonly rewireable: number; readonly unknownBoard: number } | null
  }
  patches: readonly FilterChoice[]
  blocks: readonly FilterChoice[]
  byPatch: readonly PatchCount[] | null
  today: CalendarDay
  may: { readonly run: boolean; readonly add: boolean; readonly export: boolean }
}

const whole = (n: number) => n.toLocaleString('en-GB')

const ORDER_WORDS: Record<Sort, readonly [asc: string, desc: string]> = {
  score: ['Lowest score first', 'Highest score first'],
  address: ['By address', 'By address, backwards'],
  due: ['Report ending first at the top', 'Report ending last at the top'],
  built: ['Oldest first', 'Newest first'],
  inspected: ['Longest since inspection first', 'Latest inspection first'],
}

function lineOf({ query, list }: Pick<Props, 'query' | 'list'>): string {
  const order = ORDER_WORDS[query.sort][query.order === 'asc' ? 0 : 1]
  if (list.answer)
    return `${whole(list.answer.rewireable)} with rewireable fuses, ${whole(list.answer.unknownBoard)} more not known, of ${whole(list.all)}. ${order}.`
  return list.total === list.all
    ? `${whole(list.all)} homes. ${order}.`
    : `${whole(list.total)} of ${whole(list.all)} homes. ${order}.`
}

/** The register: which homes, what is on their walls, where they stand, which first. */
export function ListScreen({ query, list, patches, blocks, byPatch, today, may }: Props) {
  const choices = { ...FIXED_CHOICES, patch: patches, block: blocks }
  const on = filtersOn(query, choices).length
  const asksRewireable = query.board.length === 1 && query.board[0] === 'rewireable-ways'
  if (list.all === 0) {
    return (
      <>
        <PageHeader title="Homes" />
        <EmptyState
          title="No homes in the register yet"
          actions={
            <>
              {may.run && <ButtonLink href="/imports/new">Import a stock list</ButtonLink>}
              {may.add && (
                <ButtonLink href="/homes/new" kind="secondary">
                  Add one home
                </ButtonLink>
              )}
            </>
          }
        >
          {may.add
            ? 'Bring the list of homes as you keep it, or add homes one by one. The ranking is there as soon as they are in.'
            : 'Homes appear here as soon as your compliance manager has brought them in, or given you a patch.'}
        </EmptyState>
      </>
    )
  }
  return (
    <>
      <PageHeader
        title="Homes"
        sub={lineOf({ query, list })}
        actions={
          <>
            {may.add && (
              <ButtonLink href="/homes/new" kind="quiet">
                Add a home
              </ButtonLink>
            )}
            {may.export && list.total > 0 && (
              <Menu trigger="Export what is shown">
                <MenuLabel>{whole(list.total)} homes, in this order and these columns</MenuLabel>
                <ExportLink href={`/api/v1/homes/export?format=xlsx&${homeQueryText(query)}`}>
                  Excel workbook (.xlsx)
                </ExportLink>
                <ExportLink href={`/api/v1/homes/export?format=csv&${homeQueryText(query)}`}>
                  Text (.csv)
                </ExportLink>
              </Menu>
            )}
          </>
        }
      />
      <div className="mb-4 flex flex-wrap items-start justify-between gap-x-4 gap-y-2">
        <div className="flex min-w-0 flex-col gap-2">
          <div className="no-print flex flex-wrap gap-2">
            <ChipLink
              href={listAddress(query, { board: asksRewireable ? [] : ['rewireable-ways'] })}
              active={asksRewireable}
            >
              Which homes still have rewireable fuses?
            </ChipLink>
          </div>
          <ListFilters query={query} choices={choices} />
        </div>
        <ListColumns key={query.columns.join()} query={query} />
      </div>
      {/* the patches count every home, so they stand only where nothing else narrows the list */}
      {byPatch && on === 1 && (
        <div className="mb-6">
          <Disclosure summary="By patch, with unknowns counted apart" open>
            <RewireableByPatch patches={byPatch} />
          </Disclosure>
        </div>
      )}
      {list.rows.length === 0 ? (
        <EmptyState
          title="No home matches"
          actions={on > 0 && <ButtonLink href="/homes">Show every home</ButtonLink>}
        >
          Take off a filter above, or look for fewer words. Unknown facts are a choice of their own in each
          filter.
        </EmptyState>
      ) : (
        <>
          <ListTable homes={list.rows} query={query} today={today} />
          <Pagination
            label="homes"
            firstHref={query.after ? listAddress(query) : null}
            nextHref={list.next ? listAddress(query, { after: list.next }) : null}
          >
            {whole(list.rows.length)} on this page
          </Pagination>
        </>
      )}
    </>
  )
}
