/** The report of one inspection: what it settles of the home, what it found, and when it wants the next. */
import { addDays } from '@/lib/calendar/add-days'
import { addYears } from '@/lib/calendar/add-years'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { type Fact, type FactKind } from '@/lib/homes/fact'
import { type SeededRandom } from '../seeded-random'
import { type DemoDefect, type DemoInspection } from './demo-home'
import { type Installation } from './installation'
import { CLOSINGS, OBSERVATIONS } from './observations'

type Chances = Readonly<Record<ClassificationCode, number>>

/** Worse boards have more wrong with them. Shares are invented for the demo. */
const FOUND: Record<'old' | 'middling' | 'new', Chances> = {
  old: { C1: 0, C2: 0.34, C3: 0.62, FI: 0.07 },
  middling: { C1: 0, C2: 0.12, C3: 0.34, FI: 0.03 },
  new: { C1: 0, C2: 0.02, C3: 0.12, FI: 0.01 },
}
const ageOf = ({ boardType, unitFitted }: Installation) =>
  boardType === 'rewireable' || boardType === 'mixed' || boardType === 'cartridge'
    ? 'old'
    : unitFitted < 2008
      ? 'middling'
      : 'new'

/** The facts of a report, all of its day. */
export function reportFacts(
  found: Installation,
  on: CalendarDay,
  firm: string,
  without: readonly FactKind[] = [],
): Fact[] {
  const fact = (kind: FactKind, value: string): Fact => ({
    kind,
    value,
    source: 'inspection',
    asOf: { day: on, precision: 'day' },
    note: `Report by ${firm}`,
  })
  return [
    fact('board-type', found.boardType),
    fact('rcd-cover', found.rcdCover),
    fact('ways', found.ways),
    fact('wiring', found.wiring),
  ].filter(({ kind }) => !without.includes(kind))
}

function defectOf(
  code: ClassificationCode,
  found: Installation,
  closedOn: CalendarDay | null,
  random: SeededRandom,
): DemoDefect {
  const { description, location } = random.pick(
    OBSERVATIONS.filter(
      (one) => one.code === code && (one.boards === null || one.boards.includes(found.boardType)),
    ),
  )
  return { code, description, location, closed: closedOn && { on: closedOn, note: random.pick(CLOSINGS) } }
}

/**
 * A report as an electrician would have handed it in on that day.
 * @param urgent the inspector found danger
 */
export function reportOf(
  found: Installation,
  on: CalendarDay,
  today: CalendarDay,
  {
    firm,
    random,
    urgent = false,
    superseded = false,
  }: { firm: string; random: SeededRandom; urgent?: boolean; superseded?: boolean },
): DemoInspection {
  const chances = FOUND[ageOf(found)]
  const codes = (Object.keys(chances) as ClassificationCode[]).filter((code) => random.chance(chances[code]))
  if (urgent) codes.unshift('C1')
  if (codes.includes('C2') && random.chance(0.3)) codes.push('C2')
  // what was found is put right within weeks, as a rule; C3 as a rule is not
  const closedOn = (code: ClassificationCode): CalendarDay | null => {
    const day = addDays(on, code === 'C3' ? random.whole(60, 500) : random.whole(4, 27))
    if (day >= today) return null
    if (superseded) return day
    return random.chance(code === 'C3' ? 0.2 : code === 'C1' ? 0 : 0.62) ? day : null
  }
  const defects = codes.map((code) => defectOf(code, found, closedOn(code), random))
  const bad = defects.some(({ code }) => code === 'C1' || code === 'C2')
  const years = bad && random.chance(0.25) ? random.whole(1, 3) : 5
  return {
    inspectedOn: { day: on, precision: 'day' },
    assessment: bad ? 'unsatisfactory' : 'satisfactory',
    nextDueOn: random.chance(0.9) ? addYears(on, years) : null,
    note: random.chance(0.12) ? random.pick(REMARKS) : null,
    facts: reportFacts(found, on, firm),
    defects,
  }
}

const REMARKS = [
  'Loft not entered: boarded and full.',
  'Bedroom 3 locked; its points not tested.',
  'Tenant present throughout.',
  'Immersion heater circuit isolated at the board on arrival.',
  'Second visit; no access at the first.',
]
