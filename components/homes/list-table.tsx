import Link from 'next/link'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { COLUMN_NAMES } from '@/lib/homes/column-names'
import { listAddress } from '@/lib/homes/filter-names'
import { type Column, type HomeQuery, type Sort } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { cellOf } from './list-cells'

const SORT_OF: Partial<Record<Column, Sort>> = {
  score: 'score',
  standing: 'due',
  built: 'built',
  inspected: 'inspected',
}
const NUMERIC: ReadonlySet<Column> = new Set(['score', 'rewired', 'bedrooms'])

/** Which way a column is sorted first: the worst score and the earliest date are what people look for. */
const firstOrder = (sort: Sort) => (sort === 'score' ? 'desc' : 'asc')

function SortLink({ sort, query, children }: { sort: Sort; query: HomeQuery; children: string }) {
  const isOn = query.sort === sort
  const order = isOn ? (query.order === 'asc' ? 'desc' : 'asc') : firstOrder(sort)
  return (
    <Link
      href={listAddress(query, { sort, order })}
      scroll={false}
      className="link-block inline-flex items-center gap-1 underline-offset-4 hover:underline"
    >
      {children}
      <span aria-hidden="true" className={isOn ? 'text-copper' : 'invisible'}>
        {query.order === 'asc' ? '↑' : '↓'}
      </span>
    </Link>
  )
}

const sortedBy = (sort: Sort | undefined, query: HomeQuery) =>
  sort !== undefined && query.sort === sort ? (query.order === 'asc' ? 'ascending' : 'descending') : undefined

/** Homes, a row each, in the columns that were chosen. */
export function ListTable({
  homes,
  query,
  today,
}: {
  homes: readonly HomeRow[]
  query: HomeQuery
  today: CalendarDay
}) {
  return (
    <Table caption="Homes">
      <thead>
        <tr>
          <HeadCell sorted={sortedBy('address', query)}>
            <SortLink sort="address" query={query}>
              Home
            </SortLink>
          </HeadCell>
          {query.columns.map((column) => {
            const sort = SORT_OF[column]
            return (
              <HeadCell key={column} numeric={NUMERIC.has(column)} sorted={sortedBy(sort, query)}>
                {sort ? (
                  <SortLink sort={sort} query={query}>
                    {COLUMN_NAMES[column]}
                  </SortLink>
                ) : (
                  COLUMN_NAMES[column]
                )}
              </HeadCell>
            )
          })}
        </tr>
      </thead>
      <tbody>
        {homes.map((home) => (
          <Row key={home.id}>
            <RowHead className="min-w-44">
              <Link
                href={`/homes/${home.id}`}
                prefetch={false}
                className="link-block text-ink underline-offset-4 hover:text-copper hover:underline"
              >
                {home.address}
              </Link>
              <span className="block text-sm font-normal text-slate">
                {[home.kind === 'communal' && 'landlord supply', home.postcode, home.patch?.name]
                  .filter(Boolean)
                  .join(' · ')}
              </span>
            </RowHead>
            {query.columns.map((column) => (
              <Cell key={column} numeric={NUMERIC.has(column)}>
                {cellOf(column, home, today)}
              </Cell>
            ))}
          </Row>
        ))}
      </tbody>
    </Table>
  )
}
