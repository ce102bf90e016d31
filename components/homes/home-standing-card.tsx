import { StandingBadge } from '@/components/drawings/standing-badge'
import { Card } from '@/components/ui/card'
import { DefinitionList } from '@/components/ui/definition-list'
import { Disclosure } from '@/components/ui/disclosure'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { type HomeRow } from '@/lib/homes/home-row'
import { TENURE_NAMES } from '@/lib/homes/tenure'
import { type StandingShown } from './home-shown'

const BASES = {
  enactment: 'Law',
  standard: 'Published standard',
  practice: 'Good practice: no enactment was found',
} as const
const READ_FROM = {
  read: 'the instrument itself',
  reported: 'guidance that reports it',
  recalled: 'recollection: check it before you rely on it',
} as const

type Props = { home: HomeRow; standing: StandingShown; today: CalendarDay; className?: string }

/** How the home stands under the duty to inspect, why, and which words of which instrument say so. */
export function HomeStandingCard({ home, standing, today, className }: Props) {
  const { reason, rule, citation, decidedBy, isOwed } = standing
  return (
    <Card
      id="standing"
      title="Standing"
      className={className}
      actions={<StandingBadge {...home} today={today} />}
    >
      <p className="max-w-reading">{reason}</p>
      {!isOwed && (
        <p className="mt-3 max-w-reading">
          The duty does not reach this home: {TENURE_NAMES[home.tenure].toLowerCase()} is outside it. The
          standing is shown so that it can be followed all the same.
        </p>
      )}
      <Disclosure summary={`The rule: ${citation}`} className="mt-3 print:hidden">
        <DefinitionList
          items={[
            { term: 'Instrument', value: rule.instrument, note: rule.title },
            { term: 'Clause', value: rule.clause ?? 'none to name' },
            {
              term: 'Kind of rule',
              value: BASES[rule.basis],
              note: `Taken from ${READ_FROM[rule.confidence]} (${rule.source}).`,
            },
            {
              term: 'How it counts',
              value: `${rule.years} years at most, ${rule.dayRule === 'anniversary' ? 'to the anniversary itself' : 'to the day before the anniversary'}`,
              note: `In force from ${dayInWords(rule.inForceFrom)}.`,
            },
            ...(decidedBy
              ? [
                  {
                    term: 'This date',
                    value: decidedBy === 'law' ? 'set by the rule' : 'set by the report, which asks for less',
                  },
                ]
              : []),
          ]}
        />
      </Disclosure>
    </Card>
  )
}
