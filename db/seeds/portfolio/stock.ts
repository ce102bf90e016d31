/** Which homes of the town the provider owns, and what they are called. */
import { seededRandom } from '../seeded-random'
import { placeOf, type Point } from '../town/plane'
import { type Form, type House } from '../town/plots'
import { type Era } from '../town/street'
import { type Town } from '../town/town'

export type StockHome = {
  readonly kind: 'dwelling' | 'communal'
  readonly address: string
  readonly street: string
  readonly district: string
  readonly block: string | null
  readonly patch: string
  readonly postcode: string
  readonly era: Era
  readonly form: Form | 'communal'
  /** the year of a block, where the block says it */
  readonly built: number | null
  readonly place: { readonly latitude: number; readonly longitude: number }
}

/** Chance that the provider built or bought in a street of the district, and the share of the street where it did. */
const HOLDINGS: Record<string, readonly [chance: number, share: number]> = {
  'Old Staithe': [0.4, 0.26],
  Loomside: [0.38, 0.36],
  Dockgate: [0.4, 0.3],
  Stationside: [0.36, 0.32],
  Larkholm: [0.36, 0.42],
  'Beacon Side': [0.6, 0.5],
  Netherfold: [0.26, 0.46],
  'Curlew Rise': [0.42, 0.42],
  Carrside: [0.3, 0.42],
  Millrace: [0.5, 0.56],
  Northgate: [0.32, 0.42],
}

const PATCHES: Record<string, string> = {
  'Old Staithe': 'Waterside',
  'Ropewalk Quay': 'Waterside',
  Loomside: 'Loomside',
  Dockgate: 'Dockgate',
  Stationside: 'Dockgate',
  Larkholm: 'Larkholm',
  'Beacon Side': 'Beacon Side',
  Netherfold: 'Netherfold',
  'Curlew Rise': 'Curlew and Carr',
  Carrside: 'Curlew and Carr',
  Millrace: 'Northgate and Millrace',
  Northgate: 'Northgate and Millrace',
}
export const PATCH_NAMES = [...new Set(Object.values(PATCHES))]

const at = (point: Point) => {
  const { latitude, longitude } = placeOf(point)
  return { latitude: Number(latitude.toFixed(6)), longitude: Number(longitude.toFixed(6)) }
}

/** Letters of a postcode's second half. @source BS 7666: none of C, I, K, M, O and V */
const UNIT = 'ABDEFGHJLNPQRSTUWXYZ'

/** Postcodes in the area ZX, which does not exist: a district a patch, a unit for about eighteen homes of a street. */
function postcodes() {
  const units = new Map<string, number>()
  const inStreet = new Map<string, { code: string; homes: number }>()
  return (patch: string, street: string): string => {
    const known = inStreet.get(street)
    if (known && known.homes < 18) {
      known.homes += 1
      return known.code
    }
    const unit = units.get(patch) ?? 0
    units.set(patch, unit + 1)
    const letters = `${UNIT[Math.floor(unit / 9) % 20] ?? 'A'}${UNIT[(unit * 7 + 3) % 20] ?? 'A'}`
    const code = `ZX${PATCH_NAMES.indexOf(patch) + 1} ${(unit % 9) + 1}${letters}`
    inStreet.set(street, { code, homes: 1 })
    return code
  }
}

/** The provider's homes in the order of their streets; the same each time. */
export function stock(town: Town): StockHome[] {
  const random = seededRandom('larrowside stock')
  const postcode = postcodes()
  const shares = new Map(
    town.streets.map(({ name, district }) => {
      const [chance, share] = HOLDINGS[district] ?? [0, 0]
      return [name, random.chance(chance) ? share * random.between(0.5, 1.5) : share * 0.06]
    }),
  )
  const patchOf = (district: string) => PATCHES[district] ?? 'Waterside'
  const houses = town.buildings.flatMap(({ houses: run }) => {
    const share = shares.get(run[0]?.street.name ?? '') ?? 0
    // a provider owns whole runs more often than a scatter
    const whole = random.chance(share * 0.6)
    return run.filter(() => (whole ? random.chance(0.9) : random.chance(share * 0.5)))
  })
  const home = ({ street, number, point, form }: House): StockHome => ({
    kind: 'dwelling',
    address: `${number} ${street.name}`,
    street: street.name,
    district: street.district,
    block: null,
    patch: patchOf(street.district),
    postcode: postcode(patchOf(street.district), street.name),
    era: street.era,
    form,
    built: null,
    place: at(point),
  })
  const flats = town.blocks.flatMap(({ block, ring }) => {
    const corner = ring[0] as Point
    const patch = patchOf(block.district)
    const shared = {
      street: block.street,
      district: block.district,
      block: block.name,
      patch,
      era: block.era,
      built: block.built,
    }
    return [
      {
        ...shared,
        kind: 'communal' as const,
        address: `Landlord’s supply, ${block.name}`,
        postcode: postcode(patch, block.name),
        form: 'communal' as const,
        place: at(corner),
      },
      ...Array.from({ length: block.flats }, (_, index) => ({
        ...shared,
        kind: 'dwelling' as const,
        address: `Flat ${index + 1}, ${block.name}`,
        postcode: postcode(patch, block.name),
        form: 'flat' as const,
        // flats of one block share its place, as they do in a landlord's own list
        place: at(block.middle),
      })).filter(() => random.chance(0.94)),
    ]
  })
  return [...houses.map(home), ...flats]
}
