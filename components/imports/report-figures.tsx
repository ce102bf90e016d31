import { type ReactNode } from 'react'
import { BOARD_TYPE_NAMES } from '@/lib/homes/board-type'
import { RCD_COVER_NAMES } from '@/lib/homes/rcd-cover'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'

/** What the report of an import counts; the shape is the report's own. */
export type Counts = {
  readonly data_rows: number
  readonly accepted: number
  readonly board: Readonly<Record<string, number>>
  readonly rcd: Readonly<Record<string, number>>
  readonly standing: Readonly<Record<string, number>>
}

const STANDING_ORDER = ['lapsed', 'never inspected', 'unknown date', 'in date']
const whole = (n: number) => n.toLocaleString('en-GB')

function CountTable({
  caption,
  counts,
  names,
  order,
}: {
  caption: string
  counts: Counts['board']
  names?: Readonly<Record<string, string>>
  order: readonly string[]
}) {
  const rows = [...order, ...Object.keys(counts).filter((key) => !order.includes(key))].filter(
    (key) => (counts[key] ?? 0) > 0,
  )
  return (
    <Table caption={caption} showCaption>
      <thead className="sr-only">
        <tr>
          <HeadCell>What</HeadCell>
          <HeadCell numeric>Homes</HeadCell>
        </tr>
      </thead>
      <tbody>
        {rows.map((key) => (
          <Row key={key}>
            <RowHead className="font-normal">
              {names?.[key] ?? key.replace(/^./, (letter) => letter.toUpperCase())}
            </RowHead>
            <Cell numeric>{whole(counts[key] ?? 0)}</Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  )
}

/** What the file says of the homes in it, in three short tables. */
export function ReportFigures({ counts, children }: { counts: Counts; children?: ReactNode }) {
  return (
    <div className="grid gap-4 md:grid-cols-3">
      <CountTable
        caption="Consumer units"
        counts={counts.board}
        names={BOARD_TYPE_NAMES}
        order={Object.keys(BOARD_TYPE_NAMES)}
      />
      <CountTable
        caption="RCD cover"
        counts={counts.rcd}
        names={RCD_COVER_NAMES}
        order={Object.keys(RCD_COVER_NAMES)}
      />
      <CountTable caption="Standing under the law" counts={counts.standing} order={STANDING_ORDER} />
      {children}
    </div>
  )
}
