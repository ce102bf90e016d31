/** What an inspector writes: observations in the words of the trade, invented for the demo, with the code that each was given. */
import { type BoardType } from '@/lib/homes/board-type'
import { type ClassificationCode } from '@/lib/homes/classification-code'

export type Observation = {
  readonly code: ClassificationCode
  readonly description: string
  readonly location: string
  /** only where the board is one of these; null: anywhere */
  readonly boards: readonly BoardType[] | null
}

const OLD: readonly BoardType[] = ['rewireable', 'mixed', 'cartridge']

const seen = (
  code: ClassificationCode,
  location: string,
  description: string,
  boards: readonly BoardType[] | null = null,
): Observation => ({ code, location, description, boards })

export const OBSERVATIONS: readonly Observation[] = [
  seen(
    'C1',
    'Bedroom 2',
    'Socket-outlet smashed through its face, live contacts within reach of a finger. Circuit locked off, tenant told.',
  ),
  seen(
    'C1',
    'Bathroom',
    'Shower isolator scorched, terminals burnt and still carrying load. Isolated and tagged at the board.',
  ),
  seen(
    'C1',
    'Hall cupboard',
    'Cover missing from the consumer unit, busbar bare at child height. Temporary shield fitted.',
    OLD,
  ),
  seen(
    'C1',
    'Kitchen',
    'Bare copper at a cooker switch pulled off the wall; supply to it cut and made safe before leaving.',
  ),
  seen(
    'C1',
    'Landing',
    'Light fitting hanging by its conductors, line terminal exposed. Removed and made safe.',
  ),
  seen(
    'C2',
    'Consumer unit',
    'Lighting fuse carrier marked 5 A rewired with 30 A wire; overload will not clear.',
    ['rewireable', 'mixed'],
  ),
  seen(
    'C2',
    'Consumer unit',
    'Scorching on two fuse carriers and the base behind them; springs have lost their grip.',
    ['rewireable', 'mixed'],
  ),
  seen(
    'C2',
    'Meter position',
    'No main bonding to the gas installation pipe that could be found or measured.',
  ),
  seen('C2', 'Meter position', 'Main bonding to water is 4 mm² and loose in its clamp.'),
  seen('C2', 'Kitchen', 'Ring final circuit open on the protective conductor: no continuity end to end.'),
  seen(
    'C2',
    'Bathroom',
    'Metal light fitting over the bath without an earth terminal, no additional protection to the circuit.',
  ),
  seen('C2', 'Loft', 'Rubber cable perished at the ceiling roses; insulation crumbles when moved.', OLD),
  seen('C2', 'Garden', 'Outside socket-outlet on a circuit without an RCD, box cracked and holding water.'),
  seen('C2', 'Consumer unit', 'RCD does not trip at its rated current; button stuck.', ['breakers', 'mixed']),
  seen('C2', 'Kitchen', 'Socket-outlet 150 mm from the sink, plate scorched round the line contact.'),
  seen('C2', 'Consumer unit', 'Neutral bar overheated, sleeving of three conductors gone brown.'),
  seen('C2', 'Throughout', 'Insulation resistance line to earth 0.3 MΩ on the upstairs lighting circuit.'),
  seen(
    'C2',
    'Hall cupboard',
    'Tails and cut-out hot to the touch under normal load; 16 mm² tails on an 80 A fuse.',
  ),
  seen(
    'FI',
    'Supply',
    'Cut-out seal broken and neutral block burnt; owner of the supply network to be asked to look.',
  ),
  seen(
    'FI',
    'Kitchen',
    'Two circuits share a neutral somewhere between kitchen and hall; could not be traced in the time.',
  ),
  seen(
    'FI',
    'Throughout',
    'Loop impedance swings between readings on the socket circuit; joint suspected under the floor.',
  ),
  seen('FI', 'Loft', 'Cables run under new insulation, grouping and size could not be seen.'),
  seen('C3', 'Consumer unit', 'No additional protection by RCD for cables concealed in walls.', [
    'rewireable',
    'cartridge',
    'breakers',
    'mixed',
  ]),
  seen('C3', 'Consumer unit', 'Plastic enclosure under wooden stairs, sole way out of the house.'),
  seen('C3', 'Consumer unit', 'Rewireable fuses throughout: correct wire fitted, no damage seen.', [
    'rewireable',
    'mixed',
  ]),
  seen('C3', 'Consumer unit', 'No surge protection and no record that it was considered.'),
  seen('C3', 'Consumer unit', 'Circuit chart missing; ways not marked.'),
  seen('C3', 'Throughout', 'Switch drops in old colours without sleeving at the switch line.'),
  seen('C3', 'Kitchen', 'Cooker control combined with a socket-outlet too near the hob.'),
  seen('C3', 'Bedroom 1', 'Only one double socket-outlet in the room, extension leads in use.'),
  seen('C3', 'Meter position', 'No label at the main earth terminal.'),
  seen('C3', 'Loft', 'Junction box lid missing, conductors sound.'),
]

/** What an officer notes between inspections; each is given a code only when an inspector has seen it. */
export const OFFICER_NOTES: readonly Observation[] = [
  seen(
    'FI',
    'Living room',
    'Tenant says lights dim when the kettle is on. Seen at the visit; asked for an electrician.',
  ),
  seen(
    'FI',
    'Kitchen',
    'Warm plug top and a brown mark on the socket by the fridge. Tenant told not to use it.',
  ),
  seen('FI', 'Bathroom', 'Tenant feels a tingle at the shower tap. Told not to use it until seen.'),
]

/** How an observation was put right. */
export const CLOSINGS: readonly string[] = [
  'Accessory renewed and circuit tested; minor works certificate received.',
  'Consumer unit renewed; installation certificate received.',
  'Bonding made and measured at 0.03 Ω; certificate received.',
  'Fault found at a joint and remade; readings steady since.',
  'Cable replaced from board to first point; tested and left working.',
]
