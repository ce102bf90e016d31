/** The national average that a home starts from, in words and with its source. */
import { type HazardAssessment } from './assessment'
import { ERAS } from './eras'
import { type AgeBand, type NationalAverage } from './national-averages'
import { type PatternFacts } from './pattern'
import { type Prepared, type PreparedHazard } from './prepare'

const AGE_WORDS: Record<AgeBand, string> = {
  'pre-1920': 'built before 1920',
  '1920-45': 'built 1920 to 1945',
  '1946-79': 'built 1946 to 1979',
  'post-1979': 'built after 1979',
}

const HAZARD_WORDS = {
  electrical: 'Electrical hazards to a child under 5',
  fire: 'Electrical part of fire to someone of 60 or over',
}

/**
 * The base of a home: the average of its age band and kind, or, where either is not known, the middle (geometric
 * mean) of the averages that it could have, weighted by how likely each is.
 */
export function baseOf(
  prepared: Prepared,
  hazard: PreparedHazard,
  facts: PatternFacts,
): HazardAssessment['base'] {
  const groups = facts.dwelling >= 0 ? [facts.dwelling] : [0, 1, 2]
  const cells = new Map<NationalAverage, number>()
  facts.eras.forEach((eraWeight, era) => {
    for (const group of groups) {
      const cell = hazard.cells[era]?.[group]
      const weight = eraWeight * (facts.dwelling >= 0 ? 1 : (prepared.dwelling[group] ?? 0))
      if (cell && weight > 0) cells.set(cell, (cells.get(cell) ?? 0) + weight)
    }
  })
  const share = prepared.method.share[hazard.hazard]
  const averages = [...cells.keys()]
  const only = averages.length === 1 ? averages[0] : undefined
  const log = [...cells].reduce((sum, [cell, weight]) => sum + weight * Math.log(cell.oneIn), 0)
  const oneIn = only ? only.oneIn / share.part : Math.exp(log) / share.part
  const kind = facts.dwelling < 0 ? 'home' : facts.dwelling === 0 ? 'house' : 'flat'
  const bands = new Set(
    facts.eras.flatMap((weight, era) => (weight > 0 ? [ERAS[era]?.ageBand as AgeBand] : [])),
  )
  const [band] = bands
  const age = bands.size === 1 && band ? AGE_WORDS[band] : 'of uncertain age'
  const averageSource = only ? only.source : 'Middle of the averages that it could have'
  const isWhole = share.part === 1
  return {
    oneIn: Math.max(1, oneIn),
    words: `${HAZARD_WORDS[hazard.hazard]}, ${kind} ${age}`,
    basis: only?.basis === 'published' && isWhole ? 'published' : 'judgement',
    source: isWhole ? averageSource : `${averageSource}; ${share.source}`,
  }
}
