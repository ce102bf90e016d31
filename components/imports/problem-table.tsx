import { Pagination } from '@/components/ui/pagination'
import { SegmentedLinks } from '@/components/ui/segmented-links'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'

export type Problem = {
  readonly row: number
  readonly sequence: number
  readonly heading: string | null
  readonly why: string
  readonly cell: string | null
}

type Props = {
  page: string
  severity: 'rejected' | 'noted'
  rejected: number
  problems: readonly Problem[]
  next: string | null
  isFirst: boolean
}

/** What is wrong, or worth knowing, row by row and column by column. */
export function ProblemTable({ page, severity, rejected, problems, next, isFirst }: Props) {
  return (
    <section aria-labelledby="rows-to-look-at">
      <div className="mb-3 flex flex-wrap items-center justify-between gap-3">
        <h2 id="rows-to-look-at" className="text-xl">
          Rows to look at
        </h2>
        <SegmentedLinks
          label="Which rows"
          segments={[
            { href: page, label: 'Rejected', current: severity === 'rejected', count: rejected },
            { href: `${page}?severity=noted`, label: 'Noted', current: severity === 'noted' },
          ]}
        />
      </div>
      {problems.length === 0 ? (
        <p className="border border-dashed border-edge bg-surface p-5 text-slate">
          {severity === 'rejected' ? 'No row was rejected.' : 'Nothing else to note.'}
        </p>
      ) : (
        <Table caption={severity === 'rejected' ? 'Rejected rows' : 'Noted rows'}>
          <thead>
            <tr>
              <HeadCell numeric>Row</HeadCell>
              <HeadCell>Column</HeadCell>
              <HeadCell>What</HeadCell>
              <HeadCell>The cell says</HeadCell>
            </tr>
          </thead>
          <tbody>
            {problems.map(({ row, sequence, heading, why, cell }) => (
              <Row key={`${row}.${sequence}`}>
                <RowHead className="text-right figures font-normal">{row}</RowHead>
                <Cell>{heading ?? 'the whole row'}</Cell>
                <Cell>{why}</Cell>
                <Cell className="max-w-80 figures break-words">{cell ?? ''}</Cell>
              </Row>
            ))}
          </tbody>
        </Table>
      )}
      <Pagination
        label="rows"
        firstHref={isFirst ? null : `${page}?severity=${severity}`}
        nextHref={next ? `${page}?severity=${severity}&after=${next}` : null}
      />
    </section>
  )
}
