/** What would make a method break its own promises: asked before a version is kept or used. */
import { type Beliefs, KNOWN_BOARD_TYPES, KNOWN_RCD_COVERS, KNOWN_WIRINGS } from './beliefs'
import { ERAS, WIRING_PERIODS } from './eras'
import { weightOfSpread } from './harm-score'
import { HAZARDS, type Method, SHIFT_KEYS, type ShiftKey, type StepsByHazard } from './method'
import { AGE_BANDS, DWELLING_KINDS } from './national-averages'

/** Steps are meant for a scale of sixteen points. */
const MOST_STEPS = 16

/** Pairs of rows where the first must add at least as much as the second: worse facts never lower a score. */
const AT_LEAST: readonly (readonly [ShiftKey, ShiftKey])[] = [
  ['board-type/rewireable', 'board-type/mixed'],
  ['board-type/mixed', 'board-type/cartridge'],
  ['board-type/cartridge', 'board-type/breakers'],
  ['board-type/breakers', 'board-type/rcbo'],
  ['rcd-cover/none', 'rcd-cover/sockets'],
  ['rcd-cover/none', 'rcd-cover/part'],
  ['rcd-cover/sockets', 'rcd-cover/all'],
  ['rcd-cover/part', 'rcd-cover/all'],
  ['wiring/lead', 'wiring/mixed'],
  ['wiring/rubber', 'wiring/mixed'],
  ['wiring/mixed', 'wiring/pvc'],
  ['wiring/mixed', 'wiring/mineral'],
  ['wiring-age/25', 'wiring-age/0'],
  ['wiring-age/40', 'wiring-age/25'],
  ['wiring-age/60', 'wiring-age/40'],
  ['inspection/lapsed-most', 'inspection/term-end'],
  ['inspection/never', 'inspection/lapsed-most'],
  ['defects/C1-most', 'defects/C1-first'],
  ['defects/C2-most', 'defects/C2-first'],
  ['defects/FI-most', 'defects/FI-first'],
  ['defects/C3-most', 'defects/C3-first'],
]

/** Rows that a good fact has no opposite of: they may not be below 0. */
const NOT_BELOW_0: readonly ShiftKey[] = [
  'inspection/term-end',
  'inspection/lapsed-year',
  'defects/C1-first',
  'defects/C2-first',
  'defects/FI-first',
  'defects/C3-first',
  'dwelling-type/bedsit',
]

/** What one fact can do between its best and its worst value: first row less second, or the first alone. */
const SINGLE_FACTS: readonly (readonly [ShiftKey, ShiftKey | null])[] = [
  ['board-type/rewireable', 'board-type/rcbo'],
  ['rcd-cover/none', 'rcd-cover/all'],
  ['wiring/rubber', 'wiring/pvc'],
  ['wiring/lead', 'wiring/pvc'],
  ['wiring-age/60', 'wiring-age/0'],
  ['inspection/never', null],
  ['defects/C2-most', null],
  ['defects/FI-most', null],
  ['defects/C3-most', null],
  ['dwelling-type/bedsit', null],
]

function shiftProblems(steps: ReadonlyMap<ShiftKey, StepsByHazard>): string[] {
  const at = (key: ShiftKey, hazard: (typeof HAZARDS)[number]) => steps.get(key)?.[hazard] ?? 0
  return HAZARDS.flatMap((hazard) => [
    ...SHIFT_KEYS.filter((key) => !(Math.abs(at(key, hazard)) <= MOST_STEPS)).map(
      (key) => `${key} (${hazard}) is not within ${MOST_STEPS} steps`,
    ),
    ...AT_LEAST.filter(([worse, better]) => at(worse, hazard) < at(better, hazard)).map(
      ([worse, better]) => `${worse} (${hazard}) adds less than ${better}`,
    ),
    ...NOT_BELOW_0.filter((key) => at(key, hazard) < 0).map((key) => `${key} (${hazard}) is below 0`),
    ...SINGLE_FACTS.filter(
      ([worst, best]) => at(worst, hazard) - (best ? at(best, hazard) : 0) >= at('defects/C1-first', hazard),
    ).map(([worst]) => `${worst} (${hazard}) weighs as much as an open C1`),
  ])
}

function beliefProblems(beliefs: Beliefs): string[] {
  const rows: (readonly [string, readonly string[], Readonly<Record<string, number>> | undefined])[] = [
    ['era', ERAS.map(({ key }) => key), beliefs.era],
    ['dwelling type', Object.keys(beliefs.dwellingType), beliefs.dwellingType],
    ...ERAS.map(
      ({ key }) =>
        [
          `wiring period, ${key}`,
          WIRING_PERIODS.map((period) => period.key),
          beliefs.wiringPeriod[key],
        ] as const,
    ),
    ...WIRING_PERIODS.map(({ key }) => [`wiring, ${key}`, KNOWN_WIRINGS, beliefs.wiring[key]] as const),
    ...WIRING_PERIODS.map(
      ({ key }) => [`board type, ${key}`, KNOWN_BOARD_TYPES, beliefs.boardType[key]] as const,
    ),
    ...KNOWN_BOARD_TYPES.map(
      (key) => [`RCD cover, ${key}`, KNOWN_RCD_COVERS, beliefs.rcdCover[key]] as const,
    ),
    [
      'inspection',
      beliefs.inspection.map((_, i) => String(i)),
      Object.fromEntries(beliefs.inspection.map(({ share }, i) => [String(i), share])),
    ],
  ]
  return rows
    .filter(([, keys, row]) => {
      const shares = keys.map((key) => row?.[key] ?? Number.NaN)
      const total = shares.reduce((sum, share) => sum + share, 0)
      return !shares.every((share) => share >= 0) || !(Math.abs(total - 1) < 1e-6)
    })
    .map(([name]) => `Shares of ${name} do not add to 1`)
}

/**
 * Every reason why a method may not be used: rows missing or twice, a better fact that would add more than a worse
 * one, a fact that would outweigh an open C1, shares that do not add to 1. Empty where it is sound.
 * @example methodProblems(FIRST_METHOD) // []
 */
export function methodProblems(method: Method, beliefs: Beliefs = method.beliefs): readonly string[] {
  const steps = new Map(method.shifts.map((row) => [row.key, row.steps]))
  const problems = SHIFT_KEYS.filter((key) => !steps.has(key)).map((key) => `${key} is missing`)
  if (steps.size !== method.shifts.length) problems.push('A shift is given twice')
  for (const hazard of HAZARDS) {
    for (const ageBand of AGE_BANDS) {
      for (const kind of DWELLING_KINDS) {
        const cells = method.averages.filter(
          (cell) => cell.hazard === hazard && cell.ageBand === ageBand && cell.kind === kind,
        )
        const cell = cells.length === 1 ? cells[0] : undefined
        if (!cell || !(cell.oneIn >= 1)) problems.push(`No one average for ${hazard}, ${kind}, ${ageBand}`)
      }
    }
    const { part } = method.share[hazard]
    if (!(part > 0 && part <= 1)) problems.push(`The share of ${hazard} is not above 0 and up to 1`)
    try {
      weightOfSpread(method.spreads[hazard].spread)
    } catch {
      problems.push(`The spread of harm of ${hazard} does not add to 100`)
    }
  }
  if (!(method.usualTermYears > 0)) problems.push('The usual term is not above 0 years')
  return [...problems, ...shiftProblems(steps), ...beliefProblems(beliefs)]
}
