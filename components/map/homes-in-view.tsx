import Link from 'next/link'
import { cellOf } from '@/components/homes/list-cells'
import { ButtonLink } from '@/components/ui/button-link'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { COLUMN_NAMES } from '@/lib/homes/column-names'
import { listAddress } from '@/lib/homes/filter-names'
import { type Column, type HomeQuery } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'

const SHOWN: readonly Column[] = ['board', 'cover', 'standing', 'defects', 'score']
const whole = (n: number) => n.toLocaleString('en-GB')

type Props = {
  query: HomeQuery
  list: { readonly rows: readonly HomeRow[]; readonly next: string | null; readonly total: number }
  today: CalendarDay
}

/** The homes in the part of the map on screen as a table, highest score first; the whole filter where no part is chosen. */
export function HomesInView({ query, list, today }: Props) {
  const more = list.total - list.rows.length
  return (
    <section aria-labelledby="homes-in-view">
      <div className="mb-3 flex flex-wrap items-end justify-between gap-x-4 gap-y-2">
        <div>
          <h2 id="homes-in-view" className="text-xl">
            Homes in view
          </h2>
          <p className="text-sm text-slate">
            {whole(list.total)} {list.total === 1 ? 'home' : 'homes'}
            {query.within ? ' in this part of the map' : ', with and without a place'}
            {more > 0 && `; the ${whole(list.rows.length)} with the highest scores are shown`}.
          </p>
        </div>
        <ButtonLink href={listAddress(query)} kind="secondary" size="compact">
          Open these in the list
        </ButtonLink>
      </div>
      {list.rows.length === 0 ? (
        <p className="border border-line bg-surface px-4 py-6 text-slate">
          No home in this part of the map. Move it, or zoom out.
        </p>
      ) : (
        <Table caption="Table of homes in view">
          <thead>
            <tr>
              <HeadCell>Home</HeadCell>
              {SHOWN.map((column) => (
                <HeadCell key={column} numeric={column === 'score'}>
                  {COLUMN_NAMES[column]}
                </HeadCell>
              ))}
            </tr>
          </thead>
          <tbody>
            {list.rows.map((home) => (
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
                    {[home.postcode, home.patch?.name, !home.place && 'no place yet']
                      .filter(Boolean)
                      .join(' · ')}
                  </span>
                </RowHead>
                {SHOWN.map((column) => (
                  <Cell key={column} numeric={column === 'score'}>
                    {cellOf(column, home, today)}
                  </Cell>
                ))}
              </Row>
            ))}
          </tbody>
        </Table>
      )}
    </section>
  )
}
