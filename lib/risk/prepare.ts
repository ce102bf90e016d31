/** A method turned into arrays once, so that a home costs a look-up and a few multiplications. */
import { type Hazard, type HazardAssessment, type Shift } from './assessment'
import { type Beliefs, KNOWN_BOARD_TYPES, KNOWN_RCD_COVERS, KNOWN_WIRINGS } from './beliefs'
import { defectSteps } from './defect-steps'
import { ERAS, WIRING_PERIODS } from './eras'
import { weightOfSpread } from './harm-score'
import { type InspectionRows, inspectionSteps } from './inspection-steps'
import { HAZARDS, type Method, type ShiftKey, type ShiftRow } from './method'
import { methodProblems } from './method-problems'
import { DWELLING_KINDS, type NationalAverage } from './national-averages'
import { type Pattern } from './pattern'
import { type AgePoint, wiringAgeSteps } from './wiring-age-steps'

export const DEFECT_CODES = ['C1', 'C2', 'FI', 'C3'] as const
/** Dwellings as the shifts see them: a bedsit is a flat with a shift of its own. */
export const DWELLING_GROUPS = ['house', 'flat', 'bedsit'] as const

export type PreparedHazard = {
  readonly hazard: Hazard
  /** national average of the hazard's part, 1 in this many, by era and then dwelling group */
  readonly oneIn: readonly (readonly number[])[]
  readonly cells: readonly (readonly NationalAverage[])[]
  readonly weight: number
  readonly spread: HazardAssessment['spread']
  /** steps by place in KNOWN_BOARD_TYPES, KNOWN_RCD_COVERS, KNOWN_WIRINGS, WIRING_PERIODS, inspection beliefs */
  readonly board: readonly number[]
  readonly rcd: readonly number[]
  readonly wiring: readonly number[]
  readonly periodAge: readonly number[]
  readonly inspection: readonly number[]
  readonly bedsit: number
  readonly inspectionRows: InspectionRows
  readonly ageAt: (years: number) => number
  readonly defectsAt: (code: (typeof DEFECT_CODES)[number], count: number) => number
  readonly shiftOf: (key: ShiftKey, fact: Shift['fact']) => Shift
}

export type Prepared = {
  readonly method: Method
  readonly year: number
  readonly hazards: readonly PreparedHazard[]
  readonly era: readonly number[]
  readonly dwelling: readonly number[]
  readonly period: readonly (readonly number[])[]
  readonly wiring: readonly (readonly number[])[]
  readonly board: readonly (readonly number[])[]
  readonly rcd: readonly (readonly number[])[]
  readonly inspection: readonly number[]
  readonly unknownSource: Pick<Shift, 'basis' | 'source'>
  readonly patterns: Map<number, Pattern>
}

const hundredths = (steps: number): number => Math.round(steps * 100) / 100

/** The rows of a table of shares, in the order of the keys. */
const inOrder = <K extends string>(keys: readonly K[], row: Readonly<Record<K, number>>): readonly number[] =>
  keys.map((key) => row[key])

function prepareHazard(method: Method, beliefs: Beliefs, year: number, hazard: Hazard): PreparedHazard {
  const rows = new Map<ShiftKey, ShiftRow>(method.shifts.map((row) => [row.key, row]))
  const rowOf = (key: ShiftKey) => rows.get(key) as ShiftRow
  const at = (key: ShiftKey) => rowOf(key).steps[hazard]
  const agePoints: readonly AgePoint[] = ([0, 25, 40, 60] as const).map((years) => ({
    years,
    steps: at(`wiring-age/${years}`),
  }))
  const ageAt = (years: number) => hundredths(wiringAgeSteps(years, agePoints))
  const inspectionRows: InspectionRows = {
    termEnd: at('inspection/term-end'),
    lapsedYear: at('inspection/lapsed-year'),
    lapsedMost: at('inspection/lapsed-most'),
    never: at('inspection/never'),
  }
  const cells = ERAS.map(({ ageBand }) =>
    DWELLING_KINDS.map(
      (kind) =>
        method.averages.find(
          (cell) => cell.hazard === hazard && cell.ageBand === ageBand && cell.kind === kind,
        ) as NationalAverage,
    ),
  ).map(([house, flat]) => [house, flat, flat] as NationalAverage[])
  const shifts = new Map<string, Shift>()
  return {
    hazard,
    cells,
    oneIn: cells.map((row) => row.map((cell) => cell.oneIn / method.share[hazard].part)),
    weight: weightOfSpread(method.spreads[hazard].spread),
    spread: method.spreads[hazard].spread,
    board: KNOWN_BOARD_TYPES.map((key) => at(`board-type/${key}`)),
    rcd: KNOWN_RCD_COVERS.map((key) => at(`rcd-cover/${key}`)),
    wiring: KNOWN_WIRINGS.map((key) => at(`wiring/${key}`)),
    periodAge: WIRING_PERIODS.map(({ typical }) => ageAt(Math.max(0, year - typical))),
    inspection: beliefs.inspection.map((belief) => inspectionSteps(belief, inspectionRows)),
    bedsit: at('dwelling-type/bedsit'),
    inspectionRows,
    ageAt,
    defectsAt: (code, count) => defectSteps(count, at(`defects/${code}-first`), at(`defects/${code}-most`)),
    shiftOf: (key, fact) => {
      const known = shifts.get(key)
      if (known) return known
      const { reason, basis, source } = rowOf(key)
      const shift: Shift = { fact, steps: at(key), reason, basis, source, unknown: false }
      shifts.set(key, shift)
      return shift
    },
  }
}

/** Periods that have not come yet cannot be when a home was wired. */
function periodShares(row: Readonly<Record<string, number>>, year: number): readonly number[] {
  const raw = WIRING_PERIODS.map(({ key, from }) => (from <= year ? (row[key] ?? 0) : 0))
  const total = raw.reduce((sum, share) => sum + share, 0)
  if (total > 0) return raw.map((share) => share / total)
  return WIRING_PERIODS.map(({ from }, i) =>
    from <= year && (WIRING_PERIODS[i + 1]?.from ?? 9999) > year ? 1 : 0,
  )
}

function build(method: Method, beliefs: Beliefs, year: number): Prepared {
  const problems = methodProblems(method, beliefs)
  if (problems.length > 0) throw new RangeError(`Method ${method.version} is unsound: ${problems.join('; ')}`)
  const periods = WIRING_PERIODS.map(({ key }) => key)
  const { flat, maisonette, bedsit, ...houses } = beliefs.dwellingType
  return {
    method,
    year,
    hazards: HAZARDS.map((hazard) => prepareHazard(method, beliefs, year, hazard)),
    era: inOrder(
      ERAS.map(({ key }) => key),
      beliefs.era,
    ),
    dwelling: [Object.values(houses).reduce((sum, share) => sum + share, 0), flat + maisonette, bedsit],
    period: ERAS.map(({ key }) => periodShares(beliefs.wiringPeriod[key], year)),
    wiring: periods.map((key) => inOrder(KNOWN_WIRINGS, beliefs.wiring[key])),
    board: periods.map((key) => inOrder(KNOWN_BOARD_TYPES, beliefs.boardType[key])),
    rcd: KNOWN_BOARD_TYPES.map((key) => inOrder(KNOWN_RCD_COVERS, beliefs.rcdCover[key])),
    inspection: beliefs.inspection.map(({ share }) => share),
    unknownSource: { basis: beliefs.basis, source: beliefs.source },
    patterns: new Map(),
  }
}

const prepared = new WeakMap<Method, WeakMap<Beliefs, Map<number, Prepared>>>()

/**
 * A method ready for scoring in a year; kept for as long as the method itself is held, so that only the first home
 * pays for it. Methods and beliefs are taken as never changing: a change is a new object.
 * @throws RangeError where the method breaks its promises (see methodProblems)
 */
export function prepare(method: Method, beliefs: Beliefs, year: number): Prepared {
  const byBeliefs = prepared.get(method) ?? new WeakMap<Beliefs, Map<number, Prepared>>()
  prepared.set(method, byBeliefs)
  const byYear = byBeliefs.get(beliefs) ?? new Map<number, Prepared>()
  byBeliefs.set(beliefs, byYear)
  const ready = byYear.get(year) ?? build(method, beliefs, year)
  byYear.set(year, ready)
  return ready
}
