import Link from 'next/link'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { type DueLineWeek, stretchHref } from './due-line-weeks'

/** The due line as a table: every week with homes, each with the way to its list. */
export function DueLineTable({
  weeks,
  hasBookings,
}: {
  weeks: readonly DueLineWeek[]
  hasBookings: boolean
}) {
  const filled = weeks.map((week, at) => ({ week, at })).filter(({ week }) => week.homes > 0)
  if (filled.length === 0) return <p>No report lapses in these weeks.</p>
  return (
    <Table caption="Reports lapsing, week by week">
      <thead>
        <tr>
          <HeadCell>Week of</HeadCell>
          <HeadCell numeric>Homes</HeadCell>
          {hasBookings && <HeadCell numeric>Booked</HeadCell>}
          <HeadCell>State</HeadCell>
        </tr>
      </thead>
      <tbody>
        {filled.map(({ week, at }) => (
          <Row key={week.monday}>
            <RowHead>
              <Link href={stretchHref(weeks, { from: at, to: at })} className="link-block link">
                {dayInWords(week.monday)}
              </Link>
            </RowHead>
            <Cell numeric>{week.homes}</Cell>
            {hasBookings && <Cell numeric>{week.booked ?? 0}</Cell>}
            <Cell>{week.past ? 'lapsed' : 'in date till then'}</Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  )
}
