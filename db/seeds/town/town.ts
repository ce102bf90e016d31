import { BLOCKS, type Block } from './blocks'
import { crowding } from './crowding'
import { ground, type Ground } from './ground'
import { DOCK_LINE, RAILWAY, type RoadClass } from './main-roads'
import { rectangle, type Ring } from './ring'
import { type Building, builtAlong } from './plots'
import { type Street } from './street'
import { streets } from './streets'

export const TOWN_NAME = 'Larrowmouth'
export const VILLAGE_NAME = 'Aberllinos'

export type Town = {
  readonly ground: Ground
  readonly streets: readonly Street[]
  readonly buildings: readonly Building[]
  readonly blocks: readonly { readonly block: Block; readonly ring: Ring }[]
  /** church, station, hall: drawn, and nobody's home */
  readonly landmarks: readonly Ring[]
}

/** Half the road and a margin [metres]: what a building keeps from the road's middle. */
const CLEAR: Record<RoadClass, number> = { main: 5.4, street: 5, lane: 3.6, close: 5, walk: 4 }

const LANDMARKS: readonly Ring[] = [
  rectangle([-330, -282], 42, 13, -0.1),
  rectangle([-322, -282], 13, 27, -0.1),
  rectangle([-245, 158], 96, 14, 0.08),
  rectangle([-190, -285], 30, 16, 0.05),
  rectangle([410, -500], 54, 24, 0.12),
  rectangle([262, -300], 46, 20, 1.45),
  rectangle([255, -360], 40, 20, 1.4),
  rectangle([262, -425], 44, 22, 1.6),
  rectangle([222, -60], 60, 22, 1.5),
  rectangle([215, 30], 52, 20, 1.62),
  rectangle([315, -640], 90, 16, 1.48),
  rectangle([-690, -860], 26, 26, 0.4),
  rectangle([1110, 225], 60, 22, -0.2),
  rectangle([-590, 560], 60, 26, 1.25),
]

let drawn: Town | undefined

/** Larrowmouth and Aberllinos: the ground, the streets, and every building. Drawn once a process. */
export const town = (): Town => (drawn ??= drawTown())

/** Draws the town afresh; the same each time. */
export function drawTown(): Town {
  const laid = streets()
  const sheet = ground()
  const room = crowding(
    [
      ...laid.map(({ line, class: kind }) => ({ line, clear: CLEAR[kind] })),
      { line: RAILWAY, clear: 11 },
      { line: DOCK_LINE, clear: 8 },
    ],
    [...sheet.water, ...sheet.greens.filter(({ kind }) => kind !== 'field').map(({ ring }) => ring)],
  )
  LANDMARKS.forEach(room.addBuilding)
  const blocks = BLOCKS.map((block) => ({
    block,
    ring: rectangle(block.middle, block.width, block.depth, (block.angle * Math.PI) / 180),
  }))
  blocks.forEach(({ ring }) => room.addBuilding(ring))
  return {
    ground: sheet,
    streets: laid,
    blocks,
    landmarks: LANDMARKS,
    buildings: laid.flatMap((street) => builtAlong(street, room)),
  }
}
