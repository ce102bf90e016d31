import { describe, expect, it } from 'vitest'
import { buildingLook, metresAPixel, roadLook } from '@/components/map/ground-look'
import { clusterMarker, homeMarker, sharesOf, svgText } from '@/components/map/marker-drawing'
import { mixColours } from '@/components/map/mix-colours'
import { ringOf, SCORE_RINGS } from '@/components/map/score-ring'
import { BOARD_TYPES } from '@/lib/homes/board-type'
import { type ColourToken, THEMES } from '@/tailwind.config'

const light = (name: string) => THEMES.light[name as ColourToken]

describe('mixColours', () => {
  it('mixes channel by channel, in long and short writing', () => {
    expect(mixColours('#000000', '#FFFFFF', 0.5)).toBe('#808080')
    expect(mixColours('#f00', '#00F', 1)).toBe('#ff0000')
    expect(mixColours('#9C4221', '#FBF8F3', 0)).toBe('#fbf8f3')
  })

  it('refuses what is no colour', () => {
    expect(() => mixColours('copper', '#FFFFFF', 0.5)).toThrow(RangeError)
    expect(() => mixColours('#12345', '#FFFFFF', 0.5)).toThrow(RangeError)
  })
})

describe('metresAPixel', () => {
  // the OpenStreetMap wiki, "Zoom levels", metres a pixel at the equator
  it.each([
    [0, 156_543.03],
    [10, 152.874],
    [15, 4.777],
    [18, 0.597],
  ])('at zoom %i is %f m at the equator', (zoom, metres) => {
    expect(metresAPixel(zoom, 0)).toBeCloseTo(metres, metres > 1_000 ? 2 : 3)
  })

  it('halves at 60 degrees north', () => {
    expect(metresAPixel(10, 60) / metresAPixel(10, 0)).toBeCloseTo(0.5, 10)
  })
})

describe('the ground', () => {
  it('leaves out what would be a smudge, and grows what is near', () => {
    expect(roadLook('walk', 'surface', 13, 54.6, light)).toMatchObject({ stroke: false })
    expect(buildingLook('house', 9, 12, 54.6, light)).toMatchObject({ stroke: false })
    const far = roadLook('main', 'surface', 15, 54.6, light).weight ?? 0
    const near = roadLook('main', 'surface', 18, 54.6, light).weight ?? 0
    expect(near / far).toBeCloseTo(8, 1)
  })
})

describe('the marks', () => {
  it('show each kind of board by a shape of its own, without colour', () => {
    const shapes = BOARD_TYPES.map((board) =>
      homeMarker(board, 'none')
        .map(({ d, dashed }) => `${d}${dashed ?? ''}`)
        .join(),
    )
    expect(new Set(shapes).size).toBe(BOARD_TYPES.length)
  })

  it('show each step of the score by the number of rings', () => {
    const counts = SCORE_RINGS.map((ring) => homeMarker('breakers', ring).length)
    expect(counts.map((count) => count - (counts.at(-1) ?? 0))).toEqual([2, 1, 0])
  })

  it('show in a cluster how many are rewireable and how many are not known', () => {
    const boards = { rewireable: 3, mixed: 1, cartridge: 1, breakers: 2, rcbo: 1, unknown: 2 }
    expect(sharesOf(boards)).toEqual({ rewireable: 4, unknown: 2, other: 4 })
    expect(clusterMarker(10, boards, 'none').some(({ dashed }) => dashed)).toBe(true)
    expect(
      clusterMarker(4, { ...boards, rewireable: 0, mixed: 0, unknown: 0 }, 'none').some(
        ({ dashed }) => dashed,
      ),
    ).toBe(false)
    expect(svgText(clusterMarker(10, boards, 'none'), '10')).toContain('>10</text>')
  })
})

describe('ringOf', () => {
  // 1,000: category 1 in SI 2005/3208; 100: where Medium begins in England since June 2026
  it.each([
    [1_000, 'double'],
    [999.9, 'single'],
    [100, 'single'],
    [99.9, 'none'],
    [0, 'none'],
  ])('of %f is %s', (score, ring) => {
    expect(ringOf(score)).toBe(ring)
  })
})
