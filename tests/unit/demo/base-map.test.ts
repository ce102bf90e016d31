import { readFileSync, readdirSync } from 'node:fs'
import { resolve } from 'node:path'
import { gzipSync } from 'node:zlib'
import { beforeAll, describe, expect, it } from 'vitest'
import { baseMapFiles } from '@/db/seeds/town/base-map-files'
import { SEA_BOX } from '@/db/seeds/town/plane'

const folder = resolve(import.meta.dirname, '../../../public/base-map')

type Position = [number, number]
type Feature = { type: string; properties: unknown; geometry: { type: string; coordinates: unknown } }

/** Anticlockwise where above zero. */
const area = (ring: Position[]) =>
  ring
    .slice(1)
    .reduce((sum, [x, y], at) => sum + ((ring[at] as Position)[0] * y - x * (ring[at] as Position)[1]) / 2, 0)

const positionsOf = (coordinates: unknown): Position[] =>
  typeof (coordinates as Position)[0] === 'number'
    ? [coordinates as Position]
    : (coordinates as unknown[]).flatMap(positionsOf)

describe('the base map', () => {
  let files: [string, string][]
  beforeAll(() => {
    files = baseMapFiles()
  }, 30_000)

  it('is what the generator draws: run db/seeds/town/write-base-map.ts after changing the town', () => {
    expect(readdirSync(folder).sort()).toEqual(files.map(([name]) => name).sort())
    for (const [name, text] of files)
      expect(readFileSync(resolve(folder, name), 'utf8') === text, name).toBe(true)
  })

  it('is light: under 400 kB, and under 100 kB as it travels', () => {
    const all = files.map(([, text]) => text).join('')
    expect(Buffer.byteLength(all)).toBeLessThan(400_000)
    expect(gzipSync(all).length).toBeLessThan(100_000)
  })

  // RFC 7946: section 3 for the types, 3.1.6 for rings, 4 for longitude before latitude in WGS 84
  it('is valid GeoJSON, in the sea', () => {
    for (const [, text] of files) {
      const collection = JSON.parse(text) as { type: string; features: Feature[] }
      expect(collection.type).toBe('FeatureCollection')
      expect(collection.features.length).toBeGreaterThan(0)
      for (const { type, properties, geometry } of collection.features) {
        expect(type).toBe('Feature')
        expect(properties).toBeTypeOf('object')
        const astray = positionsOf(geometry.coordinates).filter(
          ([longitude, latitude]) =>
            !(
              longitude > SEA_BOX.west &&
              longitude < SEA_BOX.east &&
              latitude > SEA_BOX.south &&
              latitude < SEA_BOX.north
            ),
        )
        expect(astray).toEqual([])
        if (geometry.type === 'MultiPolygon')
          for (const [outer] of geometry.coordinates as [Position[]][]) {
            expect(outer.length).toBeGreaterThanOrEqual(4)
            expect(outer[0]).toEqual(outer.at(-1))
            expect(area(outer)).toBeGreaterThan(0)
          }
        else if (geometry.type === 'LineString')
          expect((geometry.coordinates as Position[]).length).toBeGreaterThanOrEqual(2)
        else expect(['Point', 'MultiLineString']).toContain(geometry.type)
      }
    }
  })
})
