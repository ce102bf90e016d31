/** Coordinates of the British National Grid (OSGB36) to and from longitude and latitude of WGS 84. */
import proj4 from 'proj4'

/**
 * EPSG:27700 with the seven-parameter shift: within about five metres of the precise transformation, which is
 * enough to put a home in its street.
 * @source Ordnance Survey, A guide to coordinate systems in Great Britain, sections 6 and A.2; EPSG:1314
 */
const BRITISH_NATIONAL_GRID =
  '+proj=tmerc +lat_0=49 +lon_0=-2 +k=0.9996012717 +x_0=400000 +y_0=-100000 +ellps=airy ' +
  '+towgs84=446.448,-125.157,542.06,0.1502,0.247,0.8421,-20.4894 +units=m +no_defs'

const grid = proj4('WGS84', BRITISH_NATIONAL_GRID)

/** [degrees, WGS 84] */
export type Place = { readonly latitude: number; readonly longitude: number }
/** [metres, OSGB36] */
export type GridPoint = { readonly easting: number; readonly northing: number }

/**
 * The place of a grid point.
 * @example placeOfGrid({ easting: 651409.903, northing: 313177.27 }) // { latitude: 52.65798, longitude: 1.71605 }
 */
export function placeOfGrid({ easting, northing }: GridPoint): Place {
  const [longitude, latitude] = grid.inverse([easting, northing])
  return { latitude, longitude }
}

/** The grid point of a place. */
export function gridOfPlace({ latitude, longitude }: Place): GridPoint {
  const [easting, northing] = grid.forward([longitude, latitude])
  return { easting, northing }
}
