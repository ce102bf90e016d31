/** The map and the export, against the homes themselves. */
import { beforeAll, describe, expect, it } from 'vitest'
import { reading } from '@/db/connection'
import { pool } from '@/db/knex'
import * as audit from '@/db/repositories/audit'
import { FIRST_COLUMNS, type HomeQuery, homeQueryOf } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { exportHomes } from '@/lib/use-cases/homes/export-homes'
import { listHomes } from '@/lib/use-cases/homes/list-homes'
import { mapHomes, MapView } from '@/lib/use-cases/map/map-homes'
import { type AnOrganisation } from '@/tests/builders/an-organisation'
import { countingStatements } from './counting-statements'
import { everyHome, someHomes, TODAY } from './some-homes'

let organisation: AnOrganisation
let every: HomeRow[]

beforeAll(async () => {
  organisation = await someHomes(1_300, 3)
  const { organisationId: organisation_id } = organisation
  const ids = (await pool()('homes').where({ organisation_id }).limit(7).pluck('id')) as string[]
  for (const table of ['homes', 'home_register'])
    await pool()(table)
      .where({ organisation_id })
      .whereIn(table === 'homes' ? 'id' : 'home_id', ids)
      .update({ latitude: null, longitude: null })
  every = await everyHome(organisation)
})

const query = (given: Partial<HomeQuery> = {}): HomeQuery => ({ ...homeQueryOf({}), ...given })
const isRewireable = (home: HomeRow) => home.boardType === 'rewireable' || home.boardType === 'mixed'

describe('the map', () => {
  const WORLD = [-180, -90, 180, 90] as const
  const placed = () => every.filter((home) => home.place !== null)

  it.each([0, 4, 8, 11, 13, 14, 15, 16, 17, 18, 22])(
    'at zoom %i holds each home once, in few features',
    async (zoom) => {
      const { result: map, statements } = await countingStatements(() =>
        mapHomes(organisation.manager, { query: query(), box: [0.8, 53.3, 1.1, 53.6], zoom }, TODAY),
      )
      expect(map.clusters.reduce((sum, cluster) => sum + cluster.homes, map.points.length)).toBe(1_293)
      expect(map).toMatchObject({ inBox: 1_293, placed: 1_293, unplaced: 7 })
      expect(map.clusters.length + map.points.length).toBeLessThan(2_000)
      expect(statements.length).toBeLessThanOrEqual(10)
      for (const { boards, homes, box, longitude, latitude, highestScore } of map.clusters) {
        expect(Object.values(boards).reduce((sum, board) => sum + board, 0)).toBe(homes)
        expect(longitude).toBeGreaterThanOrEqual(box[0])
        expect(latitude).toBeLessThanOrEqual(box[3])
        const held = placed().filter(
          ({ place }) =>
            place &&
            place.longitude >= box[0] &&
            place.latitude >= box[1] &&
            place.longitude <= box[2] &&
            place.latitude <= box[3],
        )
        expect(held.length).toBeGreaterThanOrEqual(homes)
        expect(Math.max(...held.map((home) => home.score))).toBeGreaterThanOrEqual(highestScore)
      }
    },
  )

  it('draws apart when it comes nearer', async () => {
    const features = async (zoom: number) => {
      const { clusters, points } = await mapHomes(
        organisation.manager,
        { query: query(), box: [0.9, 53.4, 0.903, 53.402], zoom },
        TODAY,
      )
      return clusters.length + points.length
    }
    const [far, near, street] = [await features(12), await features(16), await features(18)]
    expect(far).toBeLessThan(near)
    expect(near).toBeLessThan(street)
  })

  it('shows a home as what it is', async () => {
    const [one] = placed()
    const { latitude = 0, longitude = 0 } = one?.place ?? {}
    const box = [longitude, latitude, longitude, latitude] as const
    const { points } = await mapHomes(organisation.manager, { query: query(), box, zoom: 18 }, TODAY)
    expect(points).toEqual([
      {
        id: one?.id,
        address: one?.address,
        longitude,
        latitude,
        boardType: one?.boardType,
        standing: one?.standing,
        score: one?.score,
      },
    ])
  })

  it('follows the filter, and finds what holds it all', async () => {
    const { points, clusters, extent, unplaced } = await mapHomes(
      organisation.manager,
      { query: query({ board: ['rcbo'] }), box: WORLD, zoom: 3 },
      TODAY,
    )
    const wanted = every.filter((home) => home.boardType === 'rcbo')
    const places = wanted.flatMap((home) => home.place ?? [])
    expect(clusters.reduce((sum, cluster) => sum + cluster.homes, points.length)).toBe(places.length)
    expect(clusters.every(({ boards, homes }) => boards.rcbo === homes)).toBe(true)
    expect(unplaced).toBe(wanted.length - places.length)
    expect(extent?.[0]).toBe(Math.min(...places.map((place) => place.longitude)))
    expect(extent?.[3]).toBe(Math.max(...places.map((place) => place.latitude)))
    const drawn = await mapHomes(
      organisation.manager,
      { query: query({ within: [0.9, 53.4, 0.905, 53.41] }), box: WORLD, zoom: 3 },
      TODAY,
    )
    expect(drawn.inBox).toBe(
      (await listHomes(organisation.manager, query({ within: [0.9, 53.4, 0.905, 53.41] }), TODAY)).total,
    )
  })

  it('reads its box from a query', () => {
    expect(MapView.parse({ box: '-1,50,2,55.5', zoom: '12' })).toEqual({ box: [-1, 50, 2, 55.5], zoom: 12 })
    for (const box of ['', '1,2,3', '1,2,3,x', '3,50,1,55', '-181,50,2,55', '1,2,3,4,5'])
      expect(MapView.safeParse({ box, zoom: '12' }).success).toBe(false)
  })
})

describe('the export', () => {
  it('holds every matching home in the list’s order, with the columns on screen', async () => {
    const asked = query({
      board: ['rewireable-ways', 'unknown', 'breakers'],
      sort: 'due',
      order: 'asc',
      columns: ['standing', 'board', 'patch'],
    })
    const { headings, count: promised, rows } = await exportHomes(organisation.manager, asked, TODAY)
    expect(headings).toEqual([
      'Reference',
      'UPRN',
      'Address',
      'Town',
      'Postcode',
      'Consumer unit',
      'Ways',
      'Standing',
      'Next due',
      'Patch',
    ])
    const taken: (readonly (string | number | null)[])[] = []
    for await (const row of rows) taken.push(row)
    const wanted = every.filter(
      (home) => isRewireable(home) || home.boardType === 'unknown' || home.boardType === 'breakers',
    )
    expect(taken).toHaveLength(wanted.length)
    expect(promised).toBe(wanted.length)
    const byReference = new Map(every.map((home) => [home.reference, home]))
    const first = await listHomes(organisation.manager, asked, TODAY)
    expect(taken.slice(0, 50).map(([reference]) => reference)).toEqual(
      first.rows.map((home) => home.reference),
    )
    for (const [reference, uprn, address, , , , ways, standing, due, patch] of taken) {
      const home = byReference.get(String(reference))
      expect([uprn, address, ways, standing, due, patch]).toEqual([
        home?.uprn,
        home?.address,
        home?.ways,
        home?.standing,
        home?.dueOn,
        home?.patch?.name ?? null,
      ])
    }
    expect(new Set(taken.map(([reference]) => reference)).size).toBe(taken.length)
  })

  it('reads as it is taken, and is on the audit trail before the first row', async () => {
    const asked = query({ search: 'lantern', columns: [...FIRST_COLUMNS] })
    const { rows, count: promised } = await exportHomes(organisation.auditor, asked, TODAY)
    const [entry] = await audit.list(reading(organisation.manager), { limit: 1 })
    expect(entry).toMatchObject({
      did: 'homes.exported',
      actorId: organisation.auditor.personId,
      detail: { count: promised, searched: true },
    })
    expect(JSON.stringify(entry?.detail)).not.toContain('lantern')
    const whole = await exportHomes(organisation.manager, query(), TODAY)
    const { statements } = await countingStatements(async () => {
      for await (const row of whole.rows) return row
    })
    expect(statements.length).toBe(2)
    for await (const row of rows) expect(String(row[2])).toContain('Lantern')
  })
})
