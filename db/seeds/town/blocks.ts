/** Blocks of flats, placed by hand: towers and slabs of the estate, the quay, and sheltered flats. */
import { type Point } from './plane'
import { type Era } from './street'

export type Block = {
  readonly name: string
  readonly street: string
  readonly district: string
  readonly era: Era
  readonly built: number
  readonly middle: Point
  /** [metres]; long side along `angle` [degrees] */
  readonly width: number
  readonly depth: number
  readonly angle: number
  readonly flats: number
  readonly form: 'tower' | 'slab' | 'quay' | 'sheltered'
}

type Row = readonly [string, string, number, number, number, number, number, number, number]

const of = (district: string, era: Era, form: Block['form'], rows: readonly Row[]): Block[] =>
  rows.map(([name, street, built, east, north, width, depth, angle, flats]) => ({
    name,
    street,
    district,
    era,
    form,
    built,
    middle: [east, north],
    width,
    depth,
    angle,
    flats,
  }))

export const BLOCKS: readonly Block[] = [
  // name, street, built, east, north, width, depth, angle, flats
  ...of('Netherfold', 'postwar', 'tower', [
    ['Thrift House', 'Sorrel Way', 1964, 500, 668, 22, 22, 20, 44],
    ['Marram House', 'Yarrow Road', 1965, 716, 716, 22, 22, 14, 44],
    ['Kelda House', 'Burnet Road', 1967, 952, 780, 22, 22, 30, 52],
  ]),
  ...of('Netherfold', 'postwar', 'slab', [
    ['Sundial Court', 'Campion Road', 1958, 455, 905, 52, 11, 12, 24],
    ['Barley Court', 'Campion Road', 1958, 448, 965, 52, 11, 12, 24],
    ['Harrow Court', 'Yarrow Road', 1959, 770, 965, 54, 11, 8, 24],
    ['Gleaner Court', 'Yarrow Road', 1959, 872, 985, 54, 11, 20, 24],
    ['Thresher Court', 'Fold Road', 1961, 1105, 970, 48, 11, -8, 18],
    ['Winnower Court', 'Fold Road', 1961, 1090, 915, 40, 11, -8, 15],
  ]),
  ...of('Larkholm', 'sixties', 'sheltered', [
    ['Covert Lodge', 'Shore Road', 1972, -1560, -560, 46, 13, 14, 24],
    ['Hedgerow Lodge', 'Westgate', 1974, -900, -200, 42, 13, -10, 20],
  ]),
  ...of('Beacon Side', 'sixties', 'sheltered', [
    ['Tinderbox Court', 'Beacon Road', 1969, -905, 480, 38, 12, 70, 18],
  ]),
  ...of('Stationside', 'eighties', 'slab', [
    ['Goods Yard Court', 'Station Road', 1986, 330, 212, 44, 13, 9, 18],
  ]),
  ...of('Old Staithe', 'eighties', 'sheltered', [
    ['Almoner’s Court', 'Pinfold Lane', 1983, -330, -10, 34, 12, -4, 14],
  ]),
  ...of('Ropewalk Quay', 'quay', 'quay', [
    ['Oakum Wharf', 'Ropewalk', 2006, 640, -606, 62, 15, 5, 28],
    ['Sailmaker Wharf', 'Ropewalk', 2007, 630, -710, 60, 15, 8, 28],
    ['Marline Wharf', 'Ropewalk', 2008, 560, -750, 44, 15, 0, 18],
    ['Hawser Court', 'Fathom Way', 2010, 760, -640, 44, 15, -12, 24],
    ['Tarpaulin Court', 'Tarpaulin Street', 2012, 800, -590, 40, 15, 84, 20],
    ['Fathom Court', 'Fathom Way', 2015, 900, -596, 46, 15, -42, 24],
    ['Sounding Court', 'Fathom Way', 2018, 905, -690, 50, 15, 28, 24],
  ]),
]
