/** The score of a home, with everything that it is made of. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type DwellingType } from '@/lib/homes/dwelling-type'
import { type Assessment, type HazardAssessment, type RiskFacts, type Shift } from './assessment'
import { type Beliefs, KNOWN_BOARD_TYPES, KNOWN_RCD_COVERS, KNOWN_WIRINGS } from './beliefs'
import { ERAS, eraOf, eraWeights, ORIGINAL_WIRING_FROM_ERA, wiringPeriodOf } from './eras'
import { inspectionStateOf, type InspectionState, inspectionSteps } from './inspection-steps'
import { type Method } from './method'
import { type Pattern, type PatternHazard, patternOf } from './pattern'
import { DEFECT_CODES, prepare, type Prepared, type PreparedHazard } from './prepare'

/** Patterns kept at a time; far more than a portfolio has, so that forgetting them all is rare. */
const MOST_PATTERNS = 4096

const GROUP_OF: Record<DwellingType, number> = {
  detached: 0,
  'semi-detached': 0,
  'end-terrace': 0,
  'mid-terrace': 0,
  bungalow: 0,
  flat: 1,
  maisonette: 1,
  bedsit: 2,
  unknown: -1,
}

const placeIn = (list: readonly string[], value: string): number => list.indexOf(value)

/** What is known of one home beyond its pattern. */
type Particulars = {
  readonly wiringAge: number | null
  readonly inspection: InspectionState | null
  readonly open: RiskFacts['open']
}

/** The one era that a home was built in; -1 where it could be more. */
function singleEra({ from, to }: RiskFacts['built']): number {
  const last = ERAS.length - 1
  if (from === null) return to !== null && eraOf(to) === 0 ? 0 : -1
  const era = eraOf(from)
  return to === null ? (era === last ? last : -1) : eraOf(to) === era ? era : -1
}

function findPattern(
  prepared: Prepared,
  facts: RiskFacts,
  era: number,
  period: number,
  known: boolean,
): Pattern {
  const { from, to } = facts.built
  const built =
    era >= 0 ? era : ERAS.length + (from === null ? 0 : from + 1) * 10_000 + (to === null ? 0 : to + 1)
  const dwelling = GROUP_OF[facts.dwellingType]
  const wiring = placeIn(KNOWN_WIRINGS, facts.wiring)
  const board = placeIn(KNOWN_BOARD_TYPES, facts.boardType)
  const rcd = placeIn(KNOWN_RCD_COVERS, facts.rcdCover)
  const places = (((dwelling + 1) * 7 + period + 1) * 6 + wiring + 1) * 6 + board + 1
  const key = built * 20_000 + (places * 5 + rcd + 1) * 2 + (known ? 1 : 0)
  const found = prepared.patterns.get(key)
  if (found) return found
  const eras =
    era >= 0 ? ERAS.map((_, i) => (i === era ? 1 : 0)) : eraWeights(facts.built, prepared.era, prepared.year)
  const pattern = patternOf(prepared, { eras, dwelling, period, wiring, board, rcd, inspectionKnown: known })
  if (prepared.patterns.size >= MOST_PATTERNS) prepared.patterns.clear()
  prepared.patterns.set(key, pattern)
  return pattern
}

function inspectionReason({ state, extent }: InspectionState): string {
  if (state === 'never') return 'Never inspected'
  if (state === 'in date') return 'Inspection in date'
  const years = Math.floor(extent)
  return years < 1 ? 'Inspection lapsed under a year ago' : `Inspection lapsed over ${years} years ago`
}

/** The shifts of what is particular to one home. */
function particularShifts(hazard: PreparedHazard, { wiringAge, inspection, open }: Particulars): Shift[] {
  const shifts: Shift[] = []
  if (wiringAge !== null) {
    const { basis, source } = hazard.shiftOf(wiringAge < 25 ? 'wiring-age/0' : 'wiring-age/60', 'rewired')
    const reason = `Wiring ${wiringAge} years old`
    shifts.push({ fact: 'rewired', steps: hazard.ageAt(wiringAge), reason, basis, source, unknown: false })
  }
  if (inspection) {
    const row = { 'in date': 'term-end', lapsed: 'lapsed-most', never: 'never' } as const
    const { basis, source } = hazard.shiftOf(`inspection/${row[inspection.state]}`, 'inspection')
    const steps = inspectionSteps(inspection, hazard.inspectionRows)
    shifts.push({
      fact: 'inspection',
      steps,
      reason: inspectionReason(inspection),
      basis,
      source,
      unknown: false,
    })
  }
  for (const code of DEFECT_CODES) {
    if (open[code] <= 0) continue
    const { basis, source } = hazard.shiftOf(`defects/${code}-first`, 'defects')
    const steps = hazard.defectsAt(code, open[code])
    shifts.push({
      fact: 'defects',
      steps,
      reason: `${open[code]} open ${code}`,
      basis,
      source,
      unknown: false,
    })
  }
  return shifts
}

/** The mean likelihood, where nothing is likelier than 1 in 1. */
function meanLikelihood({ base, distribution }: PatternHazard, moved: number): number {
  if ((distribution.mostFactor * moved) / base.oneIn <= 1)
    return (distribution.meanFactor * moved) / base.oneIn
  const { factors, weights } = distribution
  let mean = 0
  for (let i = 0; i < factors.length; i += 1) {
    mean += (weights[i] as number) * Math.min(1, ((factors[i] as number) * moved) / base.oneIn)
  }
  return mean
}

function assessHazard(
  prepared: Prepared,
  index: number,
  pattern: Pattern,
  particulars: Particulars,
): HazardAssessment {
  const hazard = prepared.hazards[index] as PreparedHazard
  const shared = pattern.hazards[index] as PatternHazard
  const { base, distribution } = shared
  const own = particularShifts(hazard, particulars)
  let steps = 0
  for (const shift of own) steps += shift.steps
  const moved = 10 ** (steps / 4)
  const mean = meanLikelihood(shared, moved)
  const score = hazard.weight * mean
  return {
    hazard: hazard.hazard,
    base,
    shifts: own.length > 0 ? shared.shifts.concat(own) : shared.shifts,
    score,
    low: Math.min(score, hazard.weight * Math.min(1, (distribution.lowFactor * moved) / base.oneIn)),
    high: Math.max(score, hazard.weight * Math.min(1, (distribution.highFactor * moved) / base.oneIn)),
    oneIn: 1 / mean,
    spread: hazard.spread,
    spreadBasis: prepared.method.spreads[hazard.hazard].basis,
  }
}

/**
 * The score of a home: for each hazard the national average of its age and kind, moved along the published scale by
 * what is known, averaged over everything that the unknown facts could be, and put through the published formula.
 * The home's score is the higher of the two; each is a statutory hazard of its own, so they are not added.
 *
 * The steps of a shift add up: base and shifts give `oneIn`, so long as nothing reached 1 in 1. The range runs
 * from the 5 % to the 95 % point, and is widened to hold the mean where a rare and dreadful case draws it out.
 * The averaging is exact, so the same facts, day and method give the same number.
 * @param beliefs what unknown facts could be; the method's own where none are given
 * @throws RangeError where the method is unsound (see methodProblems)
 */
export function assess(
  facts: RiskFacts,
  method: Method,
  today: CalendarDay,
  beliefs: Beliefs = method.beliefs,
): Assessment {
  const year = Number(today.slice(0, 4))
  const prepared = prepare(method, beliefs, year)
  const era = singleEra(facts.built)
  const original = era >= ORIGINAL_WIRING_FROM_ERA ? facts.built.from : null
  const wiredIn = facts.rewired ?? original
  const inspection = inspectionStateOf(facts, today, method.usualTermYears)
  const period = wiredIn === null ? -1 : wiringPeriodOf(wiredIn)
  const pattern = findPattern(prepared, facts, era, period, inspection !== null)
  const wiringAge = wiredIn === null ? null : Math.max(0, year - wiredIn)
  const particulars = { wiringAge, inspection, open: facts.open }
  const hazards = prepared.hazards.map((_, index) => assessHazard(prepared, index, pattern, particulars))
  return {
    methodVersion: method.version,
    assessedOn: today,
    score: Math.max(...hazards.map(({ score }) => score)),
    low: Math.max(...hazards.map(({ low }) => low)),
    high: Math.max(...hazards.map(({ high }) => high)),
    hazards,
    unknowns: pattern.unknowns,
  }
}
