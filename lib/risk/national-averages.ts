/**
 * National average likelihoods of the two hazards, by age and kind of dwelling.
 *
 * Two cells are known from print. The rest are ours, by one light rule: age moves the likelihood little. From the
 * printed cell each older age band is at most a quarter of a scale point likelier than the next, the bands
 * before 1946 alike. A flat is as likely as a house, save that fire spreads to it from its neighbours: a quarter
 * of a point likelier.
 * @source the printed cells: government worked-example sheets with averages of 1997 to 1999 (search excerpt).
 *   For the rule: a New Zealand study of house fires 2000 to 2009 found the rate nearly flat for houses of most of
 *   the last century and lower after 1991 (search excerpt)
 */
import { type Basis, type Hazard } from './assessment'
import { moveAlong } from './likelihood-scale'

export const AGE_BANDS = ['pre-1920', '1920-45', '1946-79', 'post-1979'] as const
export type AgeBand = (typeof AGE_BANDS)[number]

export const DWELLING_KINDS = ['house', 'flat'] as const
export type DwellingKind = (typeof DWELLING_KINDS)[number]

export type NationalAverage = {
  readonly hazard: Hazard
  readonly ageBand: AgeBand
  readonly kind: DwellingKind
  /** likelihood in twelve months to a member of the vulnerable group (under 5; 60 or over), 1 in this many */
  readonly oneIn: number
  readonly basis: Basis
  readonly source: string
}

const PRINTED: Record<Hazard, { ageBand: AgeBand; oneIn: number }> = {
  electrical: { ageBand: '1920-45', oneIn: 19_869 },
  fire: { ageBand: 'post-1979', oneIn: 5_701 },
}

/** Steps along the scale, against a house built after 1979. */
const AGE_STEPS: Record<AgeBand, number> = {
  'pre-1920': 0.5,
  '1920-45': 0.5,
  '1946-79': 0.25,
  'post-1979': 0,
}
const FLAT_STEPS: Record<Hazard, number> = { electrical: 0, fire: 0.25 }

function averageOf(hazard: Hazard, ageBand: AgeBand, kind: DwellingKind): NationalAverage {
  const printed = PRINTED[hazard]
  const isPrinted = printed.ageBand === ageBand && kind === 'house'
  const steps = AGE_STEPS[ageBand] - AGE_STEPS[printed.ageBand] + (kind === 'flat' ? FLAT_STEPS[hazard] : 0)
  return {
    hazard,
    ageBand,
    kind,
    oneIn: isPrinted ? printed.oneIn : moveAlong(printed.oneIn, steps),
    basis: isPrinted ? 'published' : 'judgement',
    source: isPrinted
      ? 'Government worked-example sheet, 1997-99 average'
      : 'Moved from the one printed average',
  }
}

export const NATIONAL_AVERAGES: readonly NationalAverage[] = (['electrical', 'fire'] as const).flatMap(
  (hazard) => AGE_BANDS.flatMap((ageBand) => DWELLING_KINDS.map((kind) => averageOf(hazard, ageBand, kind))),
)
