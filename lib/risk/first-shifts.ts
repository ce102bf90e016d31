/**
 * The first shift table. Steps are against a reference home: circuit breakers, an RCD on the sockets, PVC wiring 25
 * years old, a report new and satisfactory, nothing open. Most homes have those features, so a home like it
 * scores the national average.
 *
 * No published figure was found for how far any matter moves a likelihood: the guidance leaves it to the
 * assessor. So every row is a judgement, held within what has been published: bands printed on worked examples
 * (old wiring with no other defect stated: D; water in a switch: E; 1 in 10 in band B), and for RCDs the share of
 * deaths and fires that one could have prevented.
 * @source reference home: 59 to 77 % of rented homes in England had all five of modern wiring, earthing, consumer
 *   unit, breakers and RCD in 2014 (English Housing Survey, search excerpt)
 */
import { type ShiftKey, type ShiftRow } from './method'

const row = (key: ShiftKey, electrical: number, fire: number, reason: string, source: string): ShiftRow => ({
  key,
  steps: { electrical, fire },
  reason,
  basis: 'judgement',
  source,
})

const NO_FIGURE = 'No published figure found'
const REFERENCE = 'The reference home has this'
const FUSES = 'Slower and easily fitted with the wrong wire; no published figure'
/**
 * From none to all is 2.75 steps for shock, a factor of 4.9, and 0.4 for fire, a factor of 1.26. A share of 79 %
 * prevented (23 of 29 deaths) is a factor of 4.8, one of 67 % (12 of 18) of 3.0, and one of 20 % of 1.25.
 */
const RCD = 'RCDs could prevent 67 to 79 % of home electrocutions (Australia), 20 % of electrical fires (UK)'
const PERISHED = 'Perishes with age and heat; no published figure'
const AGEING = 'Insulation and joints age; house fires vary little with age (New Zealand)'
const UNSEEN = 'What an inspection would have found goes unseen; no published figure'
const TERM = 'An inspector chose the term by the condition seen'
const EXAMPLES = 'Held to the bands printed on worked examples'
const BEDSIT = 'Death by fire some six times as likely in shared houses, more in bedsits (low confidence)'

export const FIRST_SHIFTS: readonly ShiftRow[] = [
  row('board-type/rewireable', 2.25, 2, 'Rewireable fuses', FUSES),
  row('board-type/mixed', 1.75, 1.5, 'Some rewireable fuses', FUSES),
  row('board-type/cartridge', 1, 0.5, 'Cartridge fuses', NO_FIGURE),
  row('board-type/breakers', 0, 0, 'Circuit breakers', REFERENCE),
  row('board-type/rcbo', -0.25, -0.25, 'RCBOs', NO_FIGURE),
  row('rcd-cover/none', 2.5, 0.35, 'No RCD', RCD),
  row('rcd-cover/sockets', 0, 0, 'RCD on the sockets', REFERENCE),
  row('rcd-cover/part', 0, 0, 'RCD on part', RCD),
  row('rcd-cover/all', -0.25, -0.05, 'RCD on all circuits', RCD),
  row('wiring/lead', 1, 1, 'Lead-sheathed wiring', PERISHED),
  row('wiring/rubber', 1, 1, 'Rubber wiring', PERISHED),
  row('wiring/mixed', 0.5, 0.5, 'Mixed wiring', PERISHED),
  row('wiring/mineral', 0, 0, 'Mineral-insulated wiring', NO_FIGURE),
  row('wiring/pvc', 0, 0, 'PVC wiring', REFERENCE),
  row('wiring-age/0', -0.25, -0.25, 'New wiring', AGEING),
  row('wiring-age/25', 0, 0, 'Wiring 25 years old', REFERENCE),
  row('wiring-age/40', 1, 1, 'Wiring 40 years old', AGEING),
  row('wiring-age/60', 1.75, 1.75, 'Wiring 60 years old', AGEING),
  row('inspection/term-end', 0.5, 0.5, 'Inspected', TERM),
  row('inspection/lapsed-year', 0.2, 0.2, 'Inspection lapsed', UNSEEN),
  row('inspection/lapsed-most', 2, 2, 'Inspection lapsed', UNSEEN),
  row('inspection/never', 2.25, 2.25, 'Never inspected', UNSEEN),
  row('defects/C1-first', 6, 4.5, 'Open C1', EXAMPLES),
  row('defects/C1-most', 7, 5.5, 'Open C1', EXAMPLES),
  row('defects/C2-first', 2.75, 2, 'Open C2', EXAMPLES),
  row('defects/C2-most', 4.25, 3.25, 'Open C2', EXAMPLES),
  row('defects/FI-first', 1.5, 1.25, 'Open FI', NO_FIGURE),
  row('defects/FI-most', 2.5, 2, 'Open FI', NO_FIGURE),
  row('defects/C3-first', 0.4, 0.4, 'Open C3', NO_FIGURE),
  row('defects/C3-most', 1, 0.75, 'Open C3', NO_FIGURE),
  row('dwelling-type/bedsit', 0.5, 3.5, 'Bedsit', BEDSIT),
]
