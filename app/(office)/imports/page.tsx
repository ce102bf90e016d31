import { type Metadata } from 'next'
import Link from 'next/link'
import { show } from '@/app/show'
import { requireActor } from '@/app/session'
import { ImportStateBadge } from '@/components/imports/import-state'
import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { PageHeader } from '@/components/ui/page-header'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { can } from '@/lib/access/can'
import { listImports } from '@/lib/use-cases/imports/list-imports'

export const metadata: Metadata = { title: 'Imports' }

const when = new Intl.DateTimeFormat('en-GB', {
  dateStyle: 'long',
  timeStyle: 'short',
  timeZone: 'Europe/London',
})

export default async function ImportsPage() {
  const actor = await requireActor()
  const imports = await show(listImports(actor))
  const start = can(actor, 'imports.run') && <ButtonLink href="/imports/new">Import a stock list</ButtonLink>
  return (
    <>
      <PageHeader
        title="Imports"
        sub="Stock lists taken into the register, and what came of each."
        actions={start}
      />
      {imports.length === 0 ? (
        <EmptyState title="No stock list yet" actions={start}>
          Bring the list of homes as you keep it: Excel or CSV, any columns in any order. You see every
          problem before anything is taken in, and a second import of the same file changes nothing.
        </EmptyState>
      ) : (
        <Table caption="Imports, newest first">
          <thead>
            <tr>
              <HeadCell>File</HeadCell>
              <HeadCell>When</HeadCell>
              <HeadCell>State</HeadCell>
              <HeadCell numeric>Rows</HeadCell>
              <HeadCell numeric>New homes</HeadCell>
              <HeadCell numeric>Rejected</HeadCell>
            </tr>
          </thead>
          <tbody>
            {imports.map((one) => (
              <Row key={one.id}>
                <RowHead>
                  <Link href={`/imports/${one.id}`} className="link break-words">
                    {one.fileName}
                  </Link>
                </RowHead>
                <Cell>
                  {when.format(one.createdAt)}
                  <span className="block text-sm text-slate">{one.startedBy ?? 'from the command line'}</span>
                </Cell>
                <Cell>
                  <ImportStateBadge state={one.state} />
                </Cell>
                <Cell numeric>{one.report?.tally.data_rows.toLocaleString('en-GB') ?? ''}</Cell>
                <Cell numeric>{one.report?.homes.added.toLocaleString('en-GB') ?? ''}</Cell>
                <Cell numeric>{one.report?.rejected.toLocaleString('en-GB') ?? ''}</Cell>
              </Row>
            ))}
          </tbody>
        </Table>
      )}
    </>
  )
}
