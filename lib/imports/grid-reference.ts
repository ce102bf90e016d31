import { type GridPoint } from './osgb36'

const LETTERS = 'ABCDEFGHJKLMNOPQRSTUVWXYZ'

/**
 * The grid point that a lettered grid reference names, or null where it is none. A reference to the metre names its
 * south-west corner; a coarser one is read as the middle of its square.
 * @source Ordnance Survey, A guide to coordinate systems in Great Britain: 500 km and 100 km squares by letter, without I
 * @example gridReference('TG 51409 13177') // { easting: 651409, northing: 313177 }
 * @example gridReference('TG 514 131') // { easting: 651450, northing: 313150 }
 */
export function gridReference(text: string): GridPoint | null {
  const match = /^([HJNOST])([A-HJ-Z])(\d*)$/.exec(text.toUpperCase().replaceAll(/[\s,]/g, ''))
  if (!match) return null
  const [, first = '', second = '', digits = ''] = match
  if (digits.length % 2 !== 0 || digits.length < 4 || digits.length > 10) return null
  const [major, minor] = [LETTERS.indexOf(first), LETTERS.indexOf(second)]
  // The lettering starts two squares of 500 km west and one south of the false origin, and runs from north to south.
  const eastSquare = ((((major - 2) % 5) + 5) % 5) * 5 + (minor % 5)
  const northSquare = 19 - Math.floor(major / 5) * 5 - Math.floor(minor / 5)
  const half = digits.length / 2
  const size = 10 ** (5 - half)
  const middle = size > 1 ? size / 2 : 0
  return {
    easting: eastSquare * 100_000 + Number(digits.slice(0, half)) * size + middle,
    northing: northSquare * 100_000 + Number(digits.slice(half)) * size + middle,
  }
}
