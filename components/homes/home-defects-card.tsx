import { type ReactNode } from 'react'
import { CodeBadge } from '@/components/drawings/code-badge'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Disclosure } from '@/components/ui/disclosure'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { daysBetween } from '@/lib/calendar/days-between'
import { type FormAction } from '@/lib/forms/form-state'
import { CODE_MEANINGS } from '@/lib/homes/classification-code'
import { CloseDefectForm } from './home-close-defect-form'
import { dateWithPrecision } from './home-provenance'
import { type DefectShown } from './home-shown'
import { countOf, SOURCE_NAMES } from './home-words'

/** How long a defect has been open, as far as the day on which it was found is known. */
export function ageInWords({ raisedOn }: Pick<DefectShown, 'raisedOn'>, today: CalendarDay): string {
  if (raisedOn === null) return 'open for a time that is not known'
  const days = Math.max(0, daysBetween(raisedOn.day, today))
  if (raisedOn.precision !== 'day') return `open for up to ${countOf(days, 'day')}`
  return days === 0 ? 'open since today' : `open for ${countOf(days, 'day')}`
}

function OpenDefect({
  defect,
  today,
  children,
}: {
  defect: DefectShown
  today: CalendarDay
  children?: ReactNode
}) {
  const pressing = defect.code === 'C1' || defect.code === 'C2'
  return (
    <li className="py-4 first:pt-0 last:pb-0 print:py-1.5">
      <div className="flex gap-3">
        <div className="w-9 shrink-0">
          <CodeBadge code={defect.code} />
        </div>
        <div className="min-w-0 flex-1">
          <p className="whitespace-pre-line">{defect.description}</p>
          <p className="mt-0.5 text-sm text-slate">
            {CODE_MEANINGS[defect.code]}
            {defect.location && `. ${defect.location}`}. Found {dateWithPrecision(defect.raisedOn)},{' '}
            <strong className={pressing ? 'text-madder' : 'text-ink'}>{ageInWords(defect, today)}</strong>.{' '}
            {SOURCE_NAMES[defect.source]}
            {defect.recordedBy && `, ${defect.recordedBy}`}.
          </p>
          {children}
        </div>
      </div>
    </li>
  )
}

function ClosedDefect({ defect }: { defect: DefectShown }) {
  return (
    <li className="flex gap-3">
      <div className="w-9 shrink-0">
        <CodeBadge code={defect.code} plain />
      </div>
      <div className="min-w-0 flex-1">
        <p className="whitespace-pre-line">{defect.description}</p>
        <p className="text-sm text-slate">
          {defect.location && `${defect.location}. `}Found {dateWithPrecision(defect.raisedOn)}, put right{' '}
          {defect.closedOn && dayInWords(defect.closedOn)}
          {defect.closedBy && `, closed by ${defect.closedBy}`}.
        </p>
        {defect.closedNote && <p className="mt-0.5 text-sm whitespace-pre-line">{defect.closedNote}</p>}
      </div>
    </li>
  )
}

type Props = {
  homeId: string
  open: readonly DefectShown[]
  closed: readonly DefectShown[]
  mayEdit: boolean
  today: CalendarDay
  closeDefect: FormAction
  className?: string
}

/** What is to be put right, the most dangerous first, and what has been. */
export function HomeDefectsCard({ homeId, open, closed, mayEdit, today, closeDefect, className }: Props) {
  return (
    <Card
      id="defects"
      title={open.length > 0 ? countOf(open.length, 'open defect') : 'No open defect'}
      className={className}
      actions={
        mayEdit && (
          <ButtonLink href={`/homes/${homeId}/defect`} kind="secondary" size="compact">
            Add a defect
          </ButtonLink>
        )
      }
    >
      {open.length > 0 ? (
        <ul className="divide-y divide-line">
          {open.map((defect, at) => (
            <OpenDefect key={defect.id} defect={defect} today={today}>
              {mayEdit && (
                <CloseDefectForm
                  homeId={homeId}
                  defectId={defect.id}
                  name={`${at + 1} of ${open.length}, ${defect.code}: ${defect.description}`}
                  today={today}
                  action={closeDefect}
                />
              )}
            </OpenDefect>
          ))}
        </ul>
      ) : (
        <p className="text-slate">
          Nothing is on record as still to be put right. Observations of a report and what an officer sees go
          here.
        </p>
      )}
      {closed.length > 0 && (
        <Disclosure summary={`${countOf(closed.length, 'defect')} put right`} className="mt-4 print:hidden">
          <ul className="space-y-4">
            {closed.map((defect) => (
              <ClosedDefect key={defect.id} defect={defect} />
            ))}
          </ul>
        </Disclosure>
      )}
      <p className="mt-4 border-t border-line pt-3 text-sm text-slate print:mt-2 print:pt-1.5">
        A code is the inspector’s own. Fuseward gives none, and changes none: whoever is licensed to do the
        work decides, by the rules that hold where the home is.
      </p>
    </Card>
  )
}
