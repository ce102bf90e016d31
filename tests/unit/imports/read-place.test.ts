// The worked example of the grid is checked in tests/reference/osgb36.test.ts; here, what a list may hold.
import { describe, expect, it } from 'vitest'
import { type Cell } from '@/lib/imports/cell'
import { gridReference } from '@/lib/imports/grid-reference'
import { readGrid, readGridReference, readLatitudeLongitude } from '@/lib/imports/read-place'
import { readingOf } from './reading-of'

describe('a grid reference with letters', () => {
  // Corners of 100 km squares: Ordnance Survey's letter grid. SV is the false origin's own square.
  it.each([
    ['TG 51409 13177', 651409, 313177],
    ['TG5140913177', 651409, 313177],
    ['tg 514 131', 651450, 313150],
    ['SV 00000 00000', 0, 0],
    ['SU 00000 00000', 400000, 100000],
    ['NT 00000 00000', 300000, 600000],
    ['HP 00000 00000', 400000, 1200000],
    ['NA 00000 00000', 0, 900000],
  ])('%s is %d, %d', (text, easting, northing) => {
    expect(gridReference(text)).toEqual({ easting, northing })
  })

  it.each(['TG 514 13', 'IG 51409 13177', 'TG', 'TG 1', 'hello', '51409 13177'])('%j is none', (text) => {
    expect(gridReference(text)).toBeNull()
  })
})

describe('the place of a home', () => {
  it.each<[Cell, Cell, unknown]>([
    [null, null, null],
    ['', '?', null],
    [0, 0, null],
    [583174, null, '! easting without northing'],
    [null, 371748, '! northing without easting'],
    [900000, 300000, '! easting and northing look swapped'],
    [583174, 1400000, '! outside Great Britain'],
    [-5, 371748, '! outside Great Britain'],
    [58, 37, '! outside Great Britain'],
    ['east', 371748, '! not a number'],
  ])('easting %j and northing %j: %j', (easting, northing, expected) => {
    expect(readingOf(readGrid(easting, northing))).toEqual(expected)
  })

  it('reads numbers kept as text alike', () => {
    expect(readGrid('583,174', '371,748')).toEqual(readGrid(583174, 371748))
    expect(readGridReference('583174, 371748')).toEqual(readGrid(583174, 371748))
  })

  it.each<[Cell, Cell, unknown]>([
    [52.657979, 1.716052, { latitude: 52.657979, longitude: 1.716052 }],
    ['52.657979', '1.716052', { latitude: 52.657979, longitude: 1.716052 }],
    [1.716052, 52.657979, '! latitude and longitude look swapped'],
    [40, -74, '! outside the United Kingdom'],
    [52.6, null, '! latitude without longitude'],
    [0, 0, null],
  ])('latitude %j and longitude %j: %j', (latitude, longitude, expected) => {
    expect(readingOf(readLatitudeLongitude(latitude, longitude))).toEqual(expected)
  })
})
