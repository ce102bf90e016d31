import { seededRandom } from '../../seeded-random'
import { curveThrough } from '../line'
import { type Line, type Point, turned } from '../plane'
import { clippedTo, middleOf, type Ring } from '../ring'

/**
 * The streets that a Victorian builder ruled across a field: long ones side by side, a few across them.
 * @param angle of the long streets [radians]
 * @param pitch between long streets [metres]; a street and two rows with their yards
 * @param across between cross streets [metres]
 */
export function terraceGrid(
  ring: Ring,
  angle: number,
  pitch: number,
  across: number,
  seed: string,
): { long: Line[]; cross: Line[] } {
  const random = seededRandom(seed)
  const middle = middleOf(ring)
  const reach = 900
  const rule = (offset: number, turn: number): Line[] => {
    const bend = random.between(-5, 5)
    const points: Point[] = [-reach, -reach / 3, reach / 3, reach].map((x, at) => [
      x,
      offset + (at % 2 ? bend : -bend),
    ])
    return clippedTo(
      ring,
      curveThrough(points, 6).map((point) =>
        turned([middle[0] + point[0], middle[1] + point[1]], angle + turn, middle),
      ),
      45,
    )
  }
  const offsets = (step: number) => {
    const list: number[] = []
    for (let at = -reach + random.between(0, step); at < reach; at += step * random.between(0.94, 1.06))
      list.push(at)
    return list
  }
  return {
    long: offsets(pitch).flatMap((offset) => rule(offset, 0)),
    cross: offsets(across).flatMap((offset) => rule(offset, Math.PI / 2)),
  }
}
