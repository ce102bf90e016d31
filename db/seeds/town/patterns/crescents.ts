import { arc, curveThrough } from '../line'
import { type Line, type Point, towards } from '../plane'
import { clippedTo, type Ring } from '../ring'

/**
 * A garden suburb: crescents about a green, avenues out of it.
 * @param radii of the crescents [metres]
 * @param avenues directions [radians]
 */
export function crescents(
  ring: Ring,
  centre: Point,
  radii: readonly number[],
  avenues: readonly number[],
): { circus: Line; crescents: Line[]; avenues: Line[] } {
  const inner = radii[0] ?? 60
  const outer = radii.at(-1) ?? inner
  return {
    circus: arc(centre, inner, 0, 2 * Math.PI, 9),
    crescents: radii.slice(1).flatMap((radius, at) =>
      avenues.flatMap((from, index) => {
        const to = avenues[index + 1] ?? (avenues[0] as number) + 2 * Math.PI
        // an outer ring leaves out a sector here and there, as a plan that ran out of money does
        return at > 1 && (index + at) % 4 === 3 ? [] : clippedTo(ring, arc(centre, radius, from, to), 70)
      }),
    ),
    avenues: avenues.flatMap((angle) => {
      const bend = towards(towards(centre, angle, (inner + outer) / 2), angle + Math.PI / 2, 14)
      return clippedTo(
        ring,
        curveThrough([towards(centre, angle, inner), bend, towards(centre, angle + 0.06, outer + 330)], 6),
        60,
      ).slice(0, 1)
    }),
  }
}
