import { type ReactNode } from 'react'
import { BoardStrip } from '@/components/drawings/board-strip'
import { CodeBadge } from '@/components/drawings/code-badge'
import { RangeBar } from '@/components/drawings/range-bar'
import { StandingBadge } from '@/components/drawings/standing-badge'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { partialDateInWords } from '@/lib/calendar/partial-date-in-words'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { DWELLING_TYPE_NAMES } from '@/lib/homes/dwelling-type'
import { type Column } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { NATION_NAMES } from '@/lib/homes/nation'
import { RCD_COVER_NAMES } from '@/lib/homes/rcd-cover'
import { TENURE_NAMES } from '@/lib/homes/tenure'
import { WIRING_NAMES } from '@/lib/homes/wiring'
import { yearBuiltInWords } from '@/lib/homes/year-built'

const unknown = <span className="text-blueprint">not known</span>

/** A value, or that it is not known, never an empty cell. */
const known = (value: string | number | null): ReactNode => (value === null || value === '' ? unknown : value)
const named = (value: string, names: Readonly<Record<string, string>>): ReactNode =>
  value === 'unknown' ? unknown : names[value]

function Inspected({ home }: { home: HomeRow }) {
  if (home.inspectedOn)
    return <span className="whitespace-nowrap">{partialDateInWords(home.inspectedOn, 'short')}</span>
  return home.inspectionRecord === 'never' ? 'never' : unknown
}

const WORST_FIRST: readonly ClassificationCode[] = ['C1', 'C2', 'FI', 'C3']

function Defects({ open }: Pick<HomeRow, 'open'>) {
  const found = WORST_FIRST.filter((code) => open[code] > 0)
  if (found.length === 0) return <span className="text-slate">none on file</span>
  return (
    <span className="flex flex-wrap gap-1">
      {found.map((code) => (
        <CodeBadge key={code} code={code} count={open[code]} plain />
      ))}
    </span>
  )
}

function Built({ home }: { home: HomeRow }) {
  if (home.built.from === null && home.built.to === null) return unknown
  return (
    <>
      {yearBuiltInWords(home.built)}
      {home.rewired !== null && <span className="block text-sm text-slate">rewired {home.rewired}</span>}
    </>
  )
}

/** What a column shows of a home. */
export function cellOf(column: Column, home: HomeRow, today: CalendarDay): ReactNode {
  switch (column) {
    case 'board':
      return <BoardStrip ways={home.ways} boardType={home.boardType} rcdCover={home.rcdCover} size="list" />
    case 'cover':
      return named(home.rcdCover, RCD_COVER_NAMES)
    case 'built':
      return <Built home={home} />
    case 'inspected':
      return <Inspected home={home} />
    case 'standing':
      return <StandingBadge standing={home.standing} dueOn={home.dueOn} today={today} />
    case 'defects':
      return <Defects open={home.open} />
    case 'score':
      return (
        <span className="flex items-center justify-end gap-3">
          <span className="figures font-semibold">{Math.round(home.score).toLocaleString('en-GB')}</span>
          <RangeBar
            score={home.score}
            low={home.scoreLow}
            high={home.scoreHigh}
            nation={home.nation}
            size="list"
          />
        </span>
      )
    case 'patch':
      return home.patch?.name ?? <span className="text-slate">in no patch</span>
    case 'block':
      return home.block?.name ?? <span className="text-slate">none</span>
    case 'tenure':
      return named(home.tenure, TENURE_NAMES)
    case 'type':
      return named(home.dwellingType, DWELLING_TYPE_NAMES)
    case 'wiring':
      return named(home.wiring, WIRING_NAMES)
    case 'rewired':
      return known(home.rewired)
    case 'bedrooms':
      return known(home.bedrooms)
    case 'reference':
      return <span className="figures">{known(home.reference)}</span>
    case 'uprn':
      return <span className="figures">{known(home.uprn)}</span>
    case 'nation':
      return NATION_NAMES[home.nation]
  }
}
