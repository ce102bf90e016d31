import { type District, type HandStreet } from './district'
import { DISTRICTS } from './districts'
import { curveThrough, lengthOf } from './line'
import { DOCK_LINE, MAIN_ROADS, RAILWAY } from './main-roads'
import { closesOff } from './patterns/closes-off'
import { crescents } from './patterns/crescents'
import { terraceGrid } from './patterns/terrace-grid'
import { type Line, path } from './plane'
import { type Street } from './street'
import { STREET_NAMES } from './street-names'

/** Main roads that homes face, and the age of those homes. */
const FACED: Record<string, Pick<Street, 'frontage' | 'era' | 'district'>> = {
  'Staithe Street': { frontage: 'old', era: 'medieval', district: 'Old Staithe' },
  Castlegate: { frontage: 'old', era: 'medieval', district: 'Old Staithe' },
  'Low Quay': { frontage: 'old', era: 'medieval', district: 'Old Staithe' },
  Dockgate: { frontage: 'terrace', era: 'victorian', district: 'Dockgate' },
  'Station Road': { frontage: 'terrace', era: 'victorian', district: 'Stationside' },
  'Loom Road': { frontage: 'terrace', era: 'victorian', district: 'Loomside' },
  Westgate: { frontage: 'semi', era: 'interwar', district: 'Larkholm' },
  Northgate: { frontage: 'semi', era: 'interwar', district: 'Northgate' },
  'Shore Road': { frontage: 'semi', era: 'interwar', district: 'Larkholm' },
  'Hill Road': { frontage: 'bungalow', era: 'sixties', district: 'Beacon Side' },
  'Fold Road': { frontage: 'estate', era: 'postwar', district: 'Netherfold' },
  'Moor Road': { frontage: 'estate', era: 'postwar', district: 'Netherfold' },
}

/** Every street of the town with its name, roads first; the same each time. */
export function streets(): Street[] {
  const main: Street[] = MAIN_ROADS.map((road) => ({
    ...road,
    ...(FACED[road.name] ?? { frontage: 'none', era: 'victorian', district: 'Larrowmouth' }),
  }))
  const taken: Line[] = [...main.map((road) => road.line), RAILWAY, DOCK_LINE]
  return [
    ...main,
    ...DISTRICTS.flatMap((district) => {
      const laid = laidOut(district, taken)
      taken.push(...laid.map((street) => street.line))
      return laid
    }),
  ]
}

function laidOut(district: District, taken: readonly Line[]): Street[] {
  const { name, era, frontage, ring, layout } = district
  const street = (named: string, line: Line, kind: Street['class'] = 'street', faced = frontage): Street => ({
    name: named,
    class: kind,
    line,
    frontage: faced,
    era,
    district: name,
  })
  const byHand = (list: readonly HandStreet[]) =>
    list.map(([named, points, faced, kind]) => street(named, curveThrough(path(points), 5), kind, faced))
  const namedFrom = (names: readonly string[], lines: readonly Line[], kind: Street['class'] = 'street') =>
    [...lines]
      .sort((a, b) => lengthOf(b) - lengthOf(a))
      .slice(0, names.length)
      .map((line, at) => street(names[at] as string, line, kind))

  if (layout.by === 'hand') return byHand(layout.streets)
  if (layout.by === 'grid') {
    const { long, cross } = terraceGrid(ring, layout.angle, layout.pitch, layout.across, name)
    const names = STREET_NAMES[layout.names]
    const rows = namedFrom(names, long)
    return [...rows, ...cross.map((line, at) => street(names[rows.length + at] ?? '', line, 'lane', 'none'))]
  }
  if (layout.by === 'crescents') {
    const plan = crescents(ring, layout.centre, layout.radii, layout.avenues)
    const avenues = namedFrom(STREET_NAMES.avenues, plan.avenues)
    const curves = namedFrom(STREET_NAMES.larkholm, plan.crescents)
    const circus = street('Lark Circus', plan.circus)
    const roads = [...avenues, ...curves].map((one) => one.line)
    const closes = closesOff(roads, ring, [...taken, ...roads, plan.circus], {
      step: 90,
      reach: [50, 90],
      room: 34,
      seed: name,
    })
    return [circus, ...avenues, ...curves, ...namedFrom(STREET_NAMES[layout.closes], closes, 'close')]
  }
  const spines = byHand(layout.streets)
  const roads = spines.map((one) => one.line)
  const { step, reach, room } = layout
  const closes = closesOff(roads, ring, [...taken, ...roads], { step, reach, room, seed: name })
  return [...spines, ...namedFrom(STREET_NAMES[layout.names], closes, 'close')]
}
