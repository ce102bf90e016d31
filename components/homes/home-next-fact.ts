import { type HazardAssessment, type Shift } from '@/lib/risk/assessment'

/** What to find out, and how. Nothing here needs a tool, or a cover taken off. */
const WAYS_TO_FIND_OUT: Partial<Record<Shift['fact'], readonly [what: string, how: string]>> = {
  'board-type': [
    'what is in the consumer unit',
    'The last report says it; so does a photograph of the open flap. Nothing is to be unscrewed.',
  ],
  'rcd-cover': [
    'whether an RCD protects the circuits',
    'Look for a device with a button marked T or Test; the last report says which circuits it covers.',
  ],
  wiring: ['what the wiring is made of', 'The last report names it; an electrician on any visit can tell.'],
  rewired: ['when it was rewired', 'The file of the works or its certificate says it.'],
  built: [
    'when it was built',
    'The stock list, the deeds or an older neighbour of the file will do; a decade helps too.',
  ],
  'dwelling-type': ['what kind of dwelling it is', 'Anybody who has been there knows.'],
  inspection: [
    'when it was last inspected',
    'Look for the report in the file, or for the label at the consumer unit.',
  ],
}

export type NextFact = { readonly what: string; readonly how: string }

/**
 * The one unknown that moves a hazard's likelihood furthest; null where nothing is unknown.
 * @example nextFactOf(hazardWithUnknownCover)?.what // 'whether an RCD protects the circuits'
 */
export function nextFactOf({ shifts }: Pick<HazardAssessment, 'shifts'>): NextFact | null {
  const unknown = shifts.filter((shift) => shift.unknown && WAYS_TO_FIND_OUT[shift.fact])
  const [widest] = unknown.sort((a, b) => Math.abs(b.steps) - Math.abs(a.steps))
  const found = widest && WAYS_TO_FIND_OUT[widest.fact]
  return found ? { what: found[0], how: found[1] } : null
}
