import { beforeAll, describe, expect, it } from 'vitest'
import { placeOf, type Point, SEA_BOX } from '@/db/seeds/town/plane'
import { isInside, overlap } from '@/db/seeds/town/ring'
import { drawTown, type Town, town } from '@/db/seeds/town/town'

/**
 * The land that lies nearest to the sheet all round, longitude and latitude.
 * @source positions from memory, to a tenth of a degree
 */
const NEAREST_LAND: Record<string, readonly [number, number]> = {
  Whitby: [-0.6, 54.5],
  'Flamborough Head': [-0.1, 54.1],
  'Spurn Head': [0.1, 53.6],
  Cromer: [1.3, 52.9],
  Texel: [4.8, 53.1],
  Borkum: [6.7, 53.6],
}
const EARTH = 6_371 // mean radius [km]
const radians = (degrees: number) => (degrees * Math.PI) / 180

/** Great-circle distance [km]. @source haversine formula */
function kilometres(
  [lon1, lat1]: readonly [number, number],
  [lon2, lat2]: readonly [number, number],
): number {
  const half =
    Math.sin(radians(lat2 - lat1) / 2) ** 2 +
    Math.cos(radians(lat1)) * Math.cos(radians(lat2)) * Math.sin(radians(lon2 - lon1) / 2) ** 2
  return 2 * EARTH * Math.asin(Math.sqrt(half))
}

describe('the invented town', () => {
  let place: Town
  beforeAll(() => {
    place = town()
  }, 30_000)

  const everyPoint = (): Point[] => [
    ...place.ground.land.flat(),
    ...place.ground.greens.flatMap(({ ring }) => ring),
    ...place.streets.flatMap(({ line }) => line),
    ...place.buildings.flatMap(({ ring }) => ring),
  ]

  it('lies in its sea box, all of it', () => {
    const outside = everyPoint()
      .map(placeOf)
      .filter(
        ({ latitude, longitude }) =>
          latitude <= SEA_BOX.south ||
          latitude >= SEA_BOX.north ||
          longitude <= SEA_BOX.west ||
          longitude >= SEA_BOX.east,
      )
    expect(outside).toEqual([])
    expect(everyPoint().length).toBeGreaterThan(10_000)
  })

  it('lies more than 100 km from any land, so that it is nobody’s home', () => {
    const corners = [SEA_BOX.west, SEA_BOX.east].flatMap((lon) =>
      [SEA_BOX.south, SEA_BOX.north].map((lat) => [lon, lat] as const),
    )
    for (const land of Object.values(NEAREST_LAND))
      for (const corner of corners) expect(kilometres(land, corner)).toBeGreaterThan(100)
  })

  it('stands on land: every building, and none in the river or a dock', () => {
    const { land, water } = place.ground
    const amiss = place.buildings.filter(
      ({ ring }) =>
        ring.some((corner) => water.some((one) => isInside(one, corner))) ||
        !ring.every((corner) => land.some((one) => isInside(one, corner))),
    )
    expect(amiss).toEqual([])
  })

  it('has no building on top of another', () => {
    const rings = [...place.buildings.map(({ ring }) => ring), ...place.blocks.map(({ ring }) => ring)]
    const clashes = rings.filter((ring, at) =>
      rings.some(
        (other, index) =>
          index > at &&
          Math.abs((other[0]?.[0] ?? 0) - (ring[0]?.[0] ?? 0)) < 120 &&
          Math.abs((other[0]?.[1] ?? 0) - (ring[0]?.[1] ?? 0)) < 120 &&
          overlap(ring, other),
      ),
    )
    expect(clashes).toEqual([])
  })

  it('gives each street one name, and each home of a street a number of its own', () => {
    const names = place.streets.flatMap(({ name }) => (name ? [name] : []))
    expect(new Set(names).size).toBe(names.length)
    const doors = place.buildings.flatMap(({ houses }) =>
      houses.map(({ street, number }) => `${number} ${street.name}`),
    )
    expect(new Set(doors).size).toBe(doors.length)
    expect(doors.some((door) => /^\d+ $/.test(door))).toBe(false)
  })

  it('is the same town every time', () => {
    expect(JSON.stringify(drawTown())).toBe(JSON.stringify(place))
  }, 30_000)
})
