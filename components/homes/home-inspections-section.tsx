import { Badge } from '@/components/ui/badge'
import { ButtonLink } from '@/components/ui/button-link'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { HomeProvenance, dateWithPrecision } from './home-provenance'
import { HomeSection, NothingYet } from './home-section'
import { type InspectionShown } from './home-shown'
import { momentInWords } from './home-words'

function Outcome({ assessment }: Pick<InspectionShown, 'assessment'>) {
  if (assessment === 'satisfactory') return <Badge tone="verdigris">Satisfactory</Badge>
  if (assessment === 'unsatisfactory') return <Badge tone="madder">Unsatisfactory</Badge>
  return <Badge tone="blueprint">Outcome not known</Badge>
}

/** One report: when, how it ended, by when the next, and where that is from. One that was entered wrongly is struck out. */
function Report({ inspection }: { inspection: InspectionShown }) {
  const { inspectedOn, nextDueOn, withdrawnAt } = inspection
  return (
    <li className="grid gap-x-6 gap-y-1.5 px-4 py-3 sm:grid-cols-[minmax(0,2fr)_minmax(0,2fr)_minmax(0,4fr)] print:grid-cols-[minmax(0,1fr)_minmax(0,2fr)_minmax(0,2fr)] print:px-3 print:py-1">
      <div>
        <p className={withdrawnAt ? 'font-semibold line-through' : 'font-semibold'}>
          {dateWithPrecision(inspectedOn)}
        </p>
        {withdrawnAt && (
          <p className="text-sm text-slate">Withdrawn {momentInWords(withdrawnAt)}: it does not count</p>
        )}
      </div>
      <div>
        <Outcome assessment={inspection.assessment} />
        <p className="mt-1 text-sm text-slate print:ml-2 print:inline">
          {nextDueOn ? `Asks for the next by ${dayInWords(nextDueOn)}` : 'Names no date for the next'}
        </p>
      </div>
      <div className="min-w-0">
        <HomeProvenance {...inspection} asOf={inspectedOn} />
      </div>
    </li>
  )
}

type Props = {
  homeId: string
  inspections: readonly InspectionShown[]
  neverInspected: boolean
  mayEdit: boolean
}

/** The inspections on record, the newest first. */
export function HomeInspectionsSection({ homeId, inspections, neverInspected, mayEdit }: Props) {
  const record = mayEdit && (
    <ButtonLink href={`/homes/${homeId}/inspection`} kind="secondary" size="compact">
      Record an inspection
    </ButtonLink>
  )
  if (inspections.length === 0) {
    return (
      <HomeSection id="inspections" title="Inspections">
        <NothingYet action={record}>
          {neverInspected
            ? 'This home is on record as never inspected. Record the first inspection when its report is there.'
            : 'No inspection on record. If there is a report, record it: its date settles how the home stands.'}
        </NothingYet>
      </HomeSection>
    )
  }
  return (
    <HomeSection id="inspections" title="Inspections" actions={record}>
      <ul className="divide-y divide-line border border-line bg-surface">
        {inspections.map((inspection) => (
          <Report key={inspection.id} inspection={inspection} />
        ))}
      </ul>
    </HomeSection>
  )
}
