/**
 * The British National Grid against published worked examples.
 * Ordnance Survey, "A guide to coordinate systems in Great Britain", annex C: latitude and longitude on OSGB36 of a point
 * near Caister, and its easting and northing. EPSG guidance note 7-2, Transverse Mercator: 50°30'N 0°30'E.
 * The seven-parameter result was computed from the guide's own parameters outside this project.
 */
import proj4 from 'proj4'
import { describe, expect, it } from 'vitest'
import { gridReference } from '@/lib/imports/grid-reference'
import { gridOfPlace, placeOfGrid } from '@/lib/imports/osgb36'
import { readGridReference } from '@/lib/imports/read-place'

const dms = (degrees: number, minutes: number, seconds: number) => degrees + minutes / 60 + seconds / 3600
const CAISTER = { easting: 651409.903, northing: 313177.27 }
const CAISTER_WGS84 = { latitude: dms(52, 39, 28.723), longitude: dms(1, 42, 57.787) }

/** Metres on the ground between two places, near enough for places this close. */
function metresApart(
  one: { latitude: number; longitude: number },
  other: { latitude: number; longitude: number },
) {
  const north = (one.latitude - other.latitude) * 111_200
  const east = (one.longitude - other.longitude) * 111_200 * Math.cos((one.latitude * Math.PI) / 180)
  return Math.hypot(north, east)
}

describe('the British National Grid', () => {
  it('puts the guide’s point where the seven parameters put it, to a centimetre', () => {
    expect(metresApart(placeOfGrid(CAISTER), CAISTER_WGS84)).toBeLessThan(0.01)
    const back = gridOfPlace(CAISTER_WGS84)
    expect(back.easting).toBeCloseTo(CAISTER.easting, 1)
    expect(back.northing).toBeCloseTo(CAISTER.northing, 1)
  })

  it.each([
    {
      source: 'OS guide, annex C',
      longitude: dms(1, 43, 4.5177),
      latitude: dms(52, 39, 27.2531),
      ...CAISTER,
      tolerance: 0.002,
    },
    {
      source: 'EPSG guidance note 7-2',
      longitude: 0.5,
      latitude: 50.5,
      easting: 577274.99,
      northing: 69740.5,
      tolerance: 0.011,
    },
  ])(
    'projects the point of $source on its own ellipsoid',
    ({ longitude, latitude, easting, northing, tolerance }) => {
      // The ellipsoid's own degrees: the projection alone, without the shift to WGS 84.
      const airy =
        '+proj=tmerc +lat_0=49 +lon_0=-2 +k=0.9996012717 +x_0=400000 +y_0=-100000 +ellps=airy +units=m'
      const [east, north] = proj4('+proj=longlat +ellps=airy', airy, [longitude, latitude])
      expect(Math.abs(east - easting)).toBeLessThanOrEqual(tolerance)
      expect(Math.abs(north - northing)).toBeLessThanOrEqual(tolerance)
    },
  )

  it('reads the guide’s point from its lettered reference', () => {
    expect(gridReference('TG 51409 13177')).toEqual({ easting: 651409, northing: 313177 })
    const reading = readGridReference('TG 51409 13177')
    if (!reading.ok || !reading.value) throw new Error('The reference was not read')
    expect(metresApart(reading.value, CAISTER_WGS84)).toBeLessThan(1.1)
  })
})
