import { type ReactNode } from 'react'
import { CodeBadge } from '@/components/drawings/code-badge'
import { StandingBadge } from '@/components/drawings/standing-badge'
import { Badge } from '@/components/ui/badge'
import { Breadcrumb } from '@/components/ui/breadcrumb'
import { ButtonLink } from '@/components/ui/button-link'
import { PageHeader } from '@/components/ui/page-header'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { DWELLING_TYPE_NAMES } from '@/lib/homes/dwelling-type'
import { type HomeRow } from '@/lib/homes/home-row'
import { NATION_NAMES } from '@/lib/homes/nation'
import { TENURE_NAMES } from '@/lib/homes/tenure'
import { yearBuiltInWords } from '@/lib/homes/year-built'
import { PrintButton } from './home-print-button'
import { stepsTo } from './home-steps'

/** The codes that a page opens with: the three that make a report unsatisfactory. */
const PRESSING = ['C1', 'C2', 'FI'] as const

/** Who and where, part by part; what is not known is said to be so. */
function whereabouts(home: HomeRow): readonly ReactNode[] {
  const { town, postcode, uprn, reference, block, dwellingType, built, tenure, nation, kind } = home
  return [
    town,
    postcode,
    uprn ? (
      <>
        UPRN <span className="figures">{uprn}</span>
      </>
    ) : (
      'no UPRN'
    ),
    reference && (
      <>
        Reference <span className="figures">{reference}</span>
      </>
    ),
    block && `Block ${block.name}`,
    kind === 'communal' && 'Landlord’s supply',
    dwellingType === 'unknown' ? 'dwelling type not known' : DWELLING_TYPE_NAMES[dwellingType],
    built.from === null && built.to === null ? 'year built not known' : `built ${yearBuiltInWords(built)}`,
    tenure === 'unknown' ? 'tenure not known' : TENURE_NAMES[tenure],
    NATION_NAMES[nation],
  ].filter(Boolean)
}

type Props = { home: HomeRow; isOwed: boolean; mayEdit: boolean; today: CalendarDay }

/** The head of a home's page: who and where, how it stands, and what can be done. */
export function HomeHeader({ home, isOwed, mayEdit, today }: Props) {
  const page = `/homes/${home.id}`
  return (
    <PageHeader
      title={home.address}
      above={<Breadcrumb steps={stepsTo(home)} here="This home" />}
      sub={
        <span className="flex flex-wrap gap-x-4">
          {whereabouts(home).map((part, at) => (
            <span key={at}>
              {at > 0 && <span className="sr-only">, </span>}
              {part}
            </span>
          ))}
        </span>
      }
    >
      <StandingBadge standing={home.standing} dueOn={home.dueOn} today={today} />
      {PRESSING.filter((code) => home.open[code] > 0).map((code) => (
        <CodeBadge key={code} code={code} count={home.open[code]} />
      ))}
      {!isOwed && <Badge tone="plain">{TENURE_NAMES[home.tenure]}: outside the duty to inspect</Badge>}
      <div className="no-print flex flex-wrap gap-2 lg:ml-auto">
        {mayEdit && (
          <>
            <ButtonLink href={`${page}/inspection`} size="compact">
              Record an inspection
            </ButtonLink>
            <ButtonLink href={`${page}/facts`} kind="secondary" size="compact">
              Correct facts
            </ButtonLink>
            <ButtonLink href={`${page}/defect`} kind="secondary" size="compact">
              Add a defect
            </ButtonLink>
            <ButtonLink href={`${page}/identity`} kind="secondary" size="compact">
              Change address and tenure
            </ButtonLink>
          </>
        )}
        <PrintButton />
      </div>
    </PageHeader>
  )
}
