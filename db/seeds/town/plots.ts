/** Homes along the streets: where each stands and its number. */
import { seededRandom, type SeededRandom } from '../seeded-random'
import { type Crowding } from './crowding'
import { lengthOf, pointAlong } from './line'
import { type Point, towards } from './plane'
import { rectangle, type Ring } from './ring'
import { type Frontage, type Street } from './street'

export type Form = 'detached' | 'semi-detached' | 'end-terrace' | 'mid-terrace' | 'bungalow' | 'flat'
/** A home at a street's number: odd on the left of the street as it was laid out, even on the right. */
export type House = {
  readonly street: Street
  readonly number: number
  readonly point: Point
  readonly form: Form
}
export type Building = { readonly ring: Ring; readonly houses: readonly House[] }

/** How a frontage is built [metres]: homes in a run, width of a home, depth, gap to the next run, from road's middle to the front. */
type Habit = {
  run: readonly [number, number]
  width: number
  depth: number
  gap: readonly [number, number]
  front: number
}
const HABITS: Record<Exclude<Frontage, 'none'>, Habit> = {
  old: { run: [1, 4], width: 6.2, depth: 12, gap: [0.5, 5], front: 5.5 },
  terrace: { run: [6, 14], width: 5.1, depth: 9.5, gap: [2.5, 4], front: 7.5 },
  cottage: { run: [2, 5], width: 6, depth: 8, gap: [4, 14], front: 7 },
  semi: { run: [2, 2], width: 7, depth: 8.5, gap: [4.5, 7], front: 12.5 },
  estate: { run: [3, 6], width: 6, depth: 8.5, gap: [4, 8], front: 12 },
  detached: { run: [1, 2], width: 7.6, depth: 9, gap: [3.5, 6], front: 11.5 },
  bungalow: { run: [2, 2], width: 8.6, depth: 9, gap: [4.5, 7], front: 12 },
}

const formOf = (frontage: Frontage, at: number, run: number): Form => {
  if (frontage === 'bungalow') return 'bungalow'
  if (run === 1) return frontage === 'old' || frontage === 'cottage' ? 'mid-terrace' : 'detached'
  if (run === 2) return 'semi-detached'
  return at === 0 || at === run - 1 ? 'end-terrace' : 'mid-terrace'
}

/** Builds along one street on both sides as far as there is room, and tells the crowding of it. */
export function builtAlong(street: Street, room: Crowding): Building[] {
  if (street.frontage === 'none') return []
  const habit = HABITS[street.frontage]
  const random = seededRandom(`plots of ${street.name} ${street.district}`)
  return [1, -1].flatMap((side) => oneSide(street, habit, side, random, room))
}

function oneSide(
  street: Street,
  habit: Habit,
  side: number,
  random: SeededRandom,
  room: Crowding,
): Building[] {
  const buildings: Building[] = []
  const length = lengthOf(street.line)
  let number = side > 0 ? 1 : 2
  let along = habit.front + 2
  while (along < length) {
    const wished = random.whole(...habit.run)
    const depth = street.frontage === 'old' ? habit.depth * random.between(0.75, 1.25) : habit.depth
    let built = 0
    // a run too long for the bend or the gap is tried shorter
    for (let run = wished; run >= Math.min(2, habit.run[0]) && built === 0; run -= 1) {
      const width = run * habit.width
      if (along + width > length + 1) continue
      const start = pointAlong(street.line, along).point
      const end = pointAlong(street.line, along + width).point
      const angle = Math.atan2(end[1] - start[1], end[0] - start[0])
      const centre: Point = [(start[0] + end[0]) / 2, (start[1] + end[1]) / 2]
      const middle = towards(centre, angle + (side * Math.PI) / 2, habit.front + depth / 2)
      const ring = rectangle(middle, width - 0.2, depth, angle)
      if (!room.isFree(ring)) continue
      room.addBuilding(ring)
      const first = number
      buildings.push({
        ring,
        houses: Array.from({ length: run }, (_, at) => ({
          street,
          number: first + 2 * at,
          point: towards(middle, angle, (at + 0.5 - run / 2) * habit.width),
          form: formOf(street.frontage, at, run),
        })),
      })
      number += 2 * run
      built = width
    }
    along += built > 0 ? built + random.between(...habit.gap) : 4
  }
  return buildings
}
