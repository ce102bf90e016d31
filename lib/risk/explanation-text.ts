/**
 * An assessment as text for keeping, and back. Shifts are kept as rows without names, and each reason and source
 * once, for there is such a text for every home.
 */
import { z } from 'zod'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Assessment, type HazardAssessment, type RiskFactName, type Shift } from './assessment'

const FACTS = [
  'board-type',
  'rcd-cover',
  'wiring',
  'rewired',
  'built',
  'inspection',
  'dwelling-type',
  'defects',
] as const satisfies readonly Shift['fact'][]
const BASES = ['published', 'judgement'] as const

/** The form of the text; a later form gets a later number. */
const FORM = 1

const place = z.int().nonnegative()
const amount = z.number().nonnegative()

/** place of fact, steps, place of reason, place of basis, place of source, unknown */
const shiftRow = z.tuple([place, z.number(), place, place, place, z.literal([0, 1])])

const schema = z.object({
  form: z.literal(FORM),
  version: z.string().min(1),
  on: z.string().regex(/^\d{4}-\d{2}-\d{2}$/),
  score: z.tuple([amount, amount, amount]),
  unknowns: z.array(z.enum(FACTS).exclude(['defects'])),
  words: z.array(z.string()),
  hazards: z
    .array(
      z.object({
        hazard: z.enum(['electrical', 'fire']),
        /** 1 in, place of words, place of basis, place of source */
        base: z.tuple([z.number().positive(), place, place, place]),
        shifts: z.array(shiftRow),
        /** score, low, high, 1 in */
        score: z.tuple([amount, amount, amount, z.number().positive()]),
        spread: z.tuple([amount, amount, amount, amount]),
        spreadBasis: z.enum(BASES),
      }),
    )
    .min(1),
})

type Kept = z.infer<typeof schema>

/**
 * An assessment as text (JSON).
 * @example explanationFromText(explanationToText(assessment)) // equal to assessment
 */
export function explanationToText(assessment: Assessment): string {
  const words: string[] = []
  const placeOf = (text: string): number => {
    const found = words.indexOf(text)
    return found >= 0 ? found : words.push(text) - 1
  }
  const hazards = assessment.hazards.map((of): Kept['hazards'][number] => ({
    hazard: of.hazard,
    base: [of.base.oneIn, placeOf(of.base.words), BASES.indexOf(of.base.basis), placeOf(of.base.source)],
    shifts: of.shifts.map((shift) => [
      FACTS.indexOf(shift.fact),
      shift.steps,
      placeOf(shift.reason),
      BASES.indexOf(shift.basis),
      placeOf(shift.source),
      shift.unknown ? 1 : 0,
    ]),
    score: [of.score, of.low, of.high, of.oneIn],
    spread: [...of.spread],
    spreadBasis: of.spreadBasis,
  }))
  const kept: Kept = {
    form: FORM,
    version: assessment.methodVersion,
    on: assessment.assessedOn,
    score: [assessment.score, assessment.low, assessment.high],
    unknowns: [...assessment.unknowns],
    words,
    hazards,
  }
  return JSON.stringify(kept)
}

function at<T>(list: readonly T[], index: number): T {
  const found = list[index]
  if (found === undefined)
    throw new RangeError(`The explanation names a word that it does not hold: ${index}`)
  return found
}

/**
 * The assessment that a text holds.
 * @throws ZodError or SyntaxError where the text is no explanation, RangeError where it is cut or altered
 */
export function explanationFromText(text: string): Assessment {
  const kept = schema.parse(JSON.parse(text))
  const hazards = kept.hazards.map((of): HazardAssessment => {
    const [oneIn, words, basis, source] = of.base
    return {
      hazard: of.hazard,
      base: { oneIn, words: at(kept.words, words), basis: at(BASES, basis), source: at(kept.words, source) },
      shifts: of.shifts.map(([fact, steps, reason, shiftBasis, shiftSource, unknown]) => ({
        fact: at(FACTS, fact),
        steps,
        reason: at(kept.words, reason),
        basis: at(BASES, shiftBasis),
        source: at(kept.words, shiftSource),
        unknown: unknown === 1,
      })),
      score: of.score[0],
      low: of.score[1],
      high: of.score[2],
      oneIn: of.score[3],
      spread: of.spread,
      spreadBasis: of.spreadBasis,
    }
  })
  return {
    methodVersion: kept.version,
    assessedOn: kept.on as CalendarDay,
    score: kept.score[0],
    low: kept.score[1],
    high: kept.score[2],
    hazards,
    unknowns: kept.unknowns satisfies RiskFactName[],
  }
}
