import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { PageHeader } from '@/components/ui/page-header'

/** What a new organisation, or a new person in it, does first. */
export function FirstStep({ step }: { step: 'import' | 'ask-a-manager' | 'ask-for-a-patch' }) {
  if (step === 'import')
    return (
      <>
        <PageHeader title="Start with your homes" sub="Three steps, ten minutes." />
        <EmptyState
          title="Bring the list as you keep it"
          actions={
            <>
              <ButtonLink href="/imports/new">Import a stock list</ButtonLink>
              <ButtonLink href="/homes/new" kind="secondary">
                Add one home by hand
              </ButtonLink>
            </>
          }
        >
          <ol className="list-decimal space-y-1 pl-5">
            <li>Import a spreadsheet, any columns in any order, or type in your homes one by one.</li>
            <li>Check what could not be read, row by row, before anything is taken in.</li>
            <li>
              See which homes still have rewireable fuses, which reports have lapsed, and which home comes
              first.
            </li>
          </ol>
        </EmptyState>
      </>
    )
  return (
    <>
      <PageHeader title="No homes to show you yet" />
      <EmptyState title={step === 'ask-for-a-patch' ? 'You have no patch yet' : 'The register is empty'}>
        {step === 'ask-for-a-patch'
          ? 'Ask your compliance manager to give you the patches that you answer for.'
          : 'Your compliance manager brings the stock list in; what needs doing appears here as soon as it is in.'}
      </EmptyState>
    </>
  )
}
