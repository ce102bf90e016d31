import { Breadcrumb } from '@/components/ui/breadcrumb'
import { buttonClass } from '@/components/ui/button-class'
import { ButtonLink } from '@/components/ui/button-link'
import { Form } from '@/components/ui/form'
import { Notice } from '@/components/ui/notice'
import { PageHeader } from '@/components/ui/page-header'
import { SubmitButton } from '@/components/ui/submit-button'
import { type FormAction } from '@/lib/forms/form-state'
import { type ImportLayout } from '@/lib/imports/import-layout'
import { ChooseColumns } from './choose-columns'
import { ImportProgress } from './import-progress'
import { ImportStateBadge } from './import-state'
import { type Problem, ProblemTable } from './problem-table'
import { type Counts, ReportFigures } from './report-figures'

type Report = {
  readonly tally: Counts
  readonly homes: { readonly added: number; readonly changed: number; readonly unchanged: number }
  readonly rejected: number
  readonly kept: Readonly<Record<string, number>>
}

type Props = {
  shown: {
    readonly import: {
      readonly id: string
      readonly fileName: string
      readonly state: string
      readonly layout: ImportLayout | null
      readonly report: Report | null
      readonly failure: string | null
    }
    readonly progress: { readonly done: number; readonly total: number | null } | null
    readonly severity: 'rejected' | 'noted'
    readonly problems: readonly Problem[]
    readonly next: string | null
  }
  mayRun: boolean
  isFirstPage: boolean
  actions: Record<'chooseSheet' | 'check' | 'confirm' | 'cancel', FormAction>
}

const whole = (n: number) => n.toLocaleString('en-GB')
const homes = (n: number) => `${whole(n)} ${n === 1 ? 'home' : 'homes'}`

function summaryOf({ homes: found }: Report, isDone: boolean): string {
  const parts = [`${homes(found.added)} ${isDone ? 'added' : 'to add'}`]
  if (found.changed) parts.push(`${whole(found.changed)} ${isDone ? 'changed' : 'to change'}`)
  if (found.unchanged) parts.push(`${whole(found.unchanged)} as they were`)
  return parts.join(', ')
}

/** One import, from the choice of columns to its report. */
export function ImportScreen({ shown, mayRun, isFirstPage, actions }: Props) {
  const { id, fileName, state, layout, report, failure } = shown.import
  const page = `/imports/${id}`
  const rejected = report?.rejected ?? 0
  const hidden = <input type="hidden" name="importId" value={id} />
  const mayCancel = mayRun && ['uploaded', 'checked', 'failed'].includes(state)
  return (
    <>
      <PageHeader
        title={fileName}
        sub={
          report
            ? `${whole(report.tally.data_rows)} rows: ${summaryOf(report, state === 'done')}, ${whole(rejected)} rejected.`
            : undefined
        }
        above={<Breadcrumb steps={[{ href: '/imports', label: 'Imports' }]} here={fileName} />}
        actions={
          mayCancel && (
            <Form action={actions.cancel} label="Cancel this import">
              {hidden}
              <SubmitButton kind="quiet" pendingText="Cancelling…">
                Cancel this import
              </SubmitButton>
            </Form>
          )
        }
      >
        <ImportStateBadge state={state} />
      </PageHeader>
      <div className="space-y-8">
        {failure && (
          <Notice tone="madder" title="This import failed">
            {failure}
          </Notice>
        )}
        {(state === 'checking' || state === 'importing') && (
          <ImportProgress importId={id} state={state} start={shown.progress} />
        )}
        {report && (
          <>
            {state === 'checked' && mayRun && (
              <Notice
                tone="plain"
                title={
                  rejected > 0
                    ? `${whole(rejected)} rows will be left out; the rest can go in now`
                    : 'Every row can go in'
                }
                actions={
                  <>
                    <Form action={actions.confirm} label="Confirm">
                      {hidden}
                      <SubmitButton pendingText="Starting…">
                        Take in {homes(report.homes.added + report.homes.changed)}
                      </SubmitButton>
                    </Form>
                    {rejected > 0 && <RejectedFiles id={id} />}
                  </>
                }
              >
                Nothing has been taken in yet. Rejected rows can be mended and sent again later: homes already
                in the register are recognised and not doubled.
              </Notice>
            )}
            {state === 'done' && (
              <Notice
                tone="verdigris"
                title={summaryOf(report, true)}
                actions={
                  <>
                    <ButtonLink href="/homes">See the ranking</ButtonLink>
                    <ButtonLink href="/homes?board=rewireable-ways" kind="secondary">
                      Homes with rewireable fuses
                    </ButtonLink>
                    {rejected > 0 && <RejectedFiles id={id} />}
                  </>
                }
              />
            )}
            {Object.keys(report.kept).length > 0 && (
              <Notice tone="blueprint" title="The register’s own word was kept">
                An inspection or an officer has said otherwise since:{' '}
                {Object.entries(report.kept)
                  .map(([what, count]) => `${what} (${whole(count)})`)
                  .join(', ')}
                .
              </Notice>
            )}
            <ReportFigures counts={report.tally} />
            <ProblemTable
              page={page}
              severity={shown.severity}
              rejected={rejected}
              problems={shown.problems}
              next={shown.next}
              isFirst={isFirstPage}
            />
          </>
        )}
        {layout && mayRun && (state === 'uploaded' || state === 'checked') && (
          <ChooseColumns
            key={`${layout.sheet}.${layout.headerRow}.${state}`}
            importId={id}
            layout={layout}
            onChooseSheet={actions.chooseSheet}
            onCheck={actions.check}
          />
        )}
      </div>
    </>
  )
}

function RejectedFiles({ id }: { id: string }) {
  return (
    <>
      <a href={`/api/v1/imports/${id}/rejected?format=xlsx`} download className={buttonClass('secondary')}>
        Rejected rows, Excel
      </a>
      <a href={`/api/v1/imports/${id}/rejected?format=csv`} download className={buttonClass('secondary')}>
        Rejected rows, CSV
      </a>
    </>
  )
}
