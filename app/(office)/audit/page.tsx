import { type Metadata } from 'next'
import Link from 'next/link'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { detailInWords, entryInWords } from '@/components/audit/audit-words'
import { EmptyState } from '@/components/ui/empty-state'
import { PageHeader } from '@/components/ui/page-header'
import { Pagination } from '@/components/ui/pagination'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { ReadAuditTrail, readAuditTrail } from '@/lib/use-cases/audit/read-audit-trail'

export const metadata: Metadata = { title: 'Audit trail' }

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> }

const when = new Intl.DateTimeFormat('en-GB', {
  dateStyle: 'medium',
  timeStyle: 'medium',
  timeZone: 'Europe/London',
})

export default async function AuditPage({ searchParams }: Props) {
  const actor = await requireActor()
  const asked = ReadAuditTrail.parse(await searchParams)
  const { entries, total, next } = await show(readAuditTrail(actor, asked))
  const about = asked.subject ? `&subject=${encodeURIComponent(asked.subject)}` : ''
  return (
    <>
      <PageHeader
        title="Audit trail"
        sub={`${total.toLocaleString('en-GB')} entries, newest first. Each is tied to the one before it by a hash, and none can be changed or taken out.`}
      />
      {entries.length === 0 ? (
        <EmptyState title="Nothing yet">
          Every change of the register appears here, with who made it and when.
        </EmptyState>
      ) : (
        <>
          <Table caption="Audit trail">
            <thead>
              <tr>
                <HeadCell numeric>Entry</HeadCell>
                <HeadCell>When</HeadCell>
                <HeadCell>Who</HeadCell>
                <HeadCell>What</HeadCell>
                <HeadCell>Hash</HeadCell>
              </tr>
            </thead>
            <tbody>
              {entries.map((entry) => (
                <Row key={entry.sequence}>
                  <RowHead className="text-right figures font-normal">{entry.sequence}</RowHead>
                  <Cell className="whitespace-nowrap">{when.format(new Date(entry.at))}</Cell>
                  <Cell>{entry.actorName ?? 'the program'}</Cell>
                  <Cell className="min-w-64">
                    {entry.subjectKind === 'home' ? (
                      <Link href={`/homes/${entry.subjectId}`} className="link" prefetch={false}>
                        {entryInWords(entry.did)}
                      </Link>
                    ) : (
                      entryInWords(entry.did)
                    )}
                    <span className="block text-sm break-words text-slate">
                      {detailInWords(entry.detail)}
                    </span>
                  </Cell>
                  <Cell className="figures text-sm" title={entry.hash}>
                    {entry.hash.slice(0, 10)}
                  </Cell>
                </Row>
              ))}
            </tbody>
          </Table>
          <Pagination
            label="the audit trail"
            firstHref={asked.before ? `/audit${about.replace('&', '?')}` : null}
            nextHref={next === null ? null : `/audit?before=${next}${about}`}
          />
        </>
      )}
    </>
  )
}
