import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { type DwellingType } from '@/lib/homes/dwelling-type'
import { type Fact, type FactKind } from '@/lib/homes/fact'
import { readFactValue } from '@/lib/homes/fact-value'
import { type Nation } from '@/lib/homes/nation'
import { type InspectionRecord } from '@/lib/homes/standing'
import { type Wiring } from '@/lib/homes/wiring'
import { type YearBuilt } from '@/lib/homes/year-built'
import { type Board, boardOfFacts } from './board-of-facts'
import { inspectionDue } from './inspection-interval'
import { type InspectionOnRecord, latestInspection } from './latest-inspection'
import { type Sector } from './sector'

/** What the register knows of a home now: enough for its row in the list, its standing and its score. */
export type CurrentHome = Board & {
  readonly nation: Nation
  readonly built: YearBuilt
  readonly dwellingType: DwellingType
  readonly wiring: Wiring
  readonly rewired: number | null
  readonly bedrooms: number | null
  readonly inspectionRecord: InspectionRecord
  readonly inspectedOn: PartialDate | null
  readonly assessment: 'satisfactory' | 'unsatisfactory' | null
  /** last day that the latest report covers; null unless the record is dated */
  readonly dueOn: CalendarDay | null
  /** what set that day; null where there is none */
  readonly decidedBy: 'law' | 'report' | null
  readonly open: Readonly<Record<ClassificationCode, number>>
}

/**
 * The current view of a home, from what is on record of it. Latest inspection wins; a home counts as
 * never inspected only where a fact says so and no inspection is on record.
 * @param input.facts the current ones; at most one of a kind, and a kind without one is not known
 * @param input.sector by `sectorOf`; the private sector's rules where it is left out
 * @throws Invalid where a stored value is none of its kind
 * @example deriveCurrent({ nation: 'england', facts: [], inspections: [], openDefects: { C1: 0, C2: 0, C3: 0, FI: 0 } })
 *   .inspectionRecord // 'unknown'
 */
export function deriveCurrent(input: {
  nation: Nation
  facts: readonly Fact[]
  inspections: readonly InspectionOnRecord[]
  openDefects: Readonly<Record<ClassificationCode, number>>
  sector?: Sector
}): CurrentHome {
  const read = <K extends FactKind>(kind: K) =>
    readFactValue(kind, input.facts.find((fact) => fact.kind === kind)?.value ?? null).value
  const latest = latestInspection(input.inspections)
  const due = latest && inspectionDue(input.nation, latest.inspectedOn, latest.nextDueOn, input.sector)
  return {
    nation: input.nation,
    ...boardOfFacts(input.facts),
    built: read('built'),
    dwellingType: read('dwelling-type'),
    wiring: read('wiring'),
    rewired: read('rewired'),
    bedrooms: read('bedrooms'),
    inspectionRecord: latest ? 'dated' : read('inspection-record') === 'never' ? 'never' : 'unknown',
    inspectedOn: latest?.inspectedOn ?? null,
    assessment: latest?.assessment ?? null,
    dueOn: due?.dueOn ?? null,
    decidedBy: due?.decidedBy ?? null,
    open: input.openDefects,
  }
}
