import { EmptyState } from '@/components/ui/empty-state'
import { PageHeader } from '@/components/ui/page-header'

/** What a contractor's people see before an organisation has issued them anything. */
export function VisitsScreen({ organisationName }: { organisationName: string }) {
  return (
    <>
      <PageHeader title="Visits" sub={`For ${organisationName}`} />
      <EmptyState title="No work has been issued to your firm yet">
        When {organisationName} issues homes to inspect to your firm, they appear here. Until then there is
        nothing for you to do.
      </EmptyState>
    </>
  )
}
