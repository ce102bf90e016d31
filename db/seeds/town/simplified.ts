import { distanceTo } from './line'
import { type Line, type Point } from './plane'

/**
 * The line without the points that it can spare: what is left out lies within `tolerance` of what stays [metres].
 * @source D. Douglas and T. Peucker, Cartographica 10(2), 1973 (from memory)
 */
export function simplified(line: Line, tolerance: number): Point[] {
  const [first, last] = [line[0] as Point, line.at(-1) as Point]
  let [far, at] = [0, 0]
  line.slice(1, -1).forEach((point, index) => {
    const away = distanceTo([first, last], point)
    if (away > far) [far, at] = [away, index + 1]
  })
  if (far <= tolerance) return [first, last]
  return [...simplified(line.slice(0, at + 1), tolerance), ...simplified(line.slice(at), tolerance).slice(1)]
}
