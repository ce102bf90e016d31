/** The first lines of an address, its town and its postcode, from the columns that a list may have for them. */
import { foldAddress } from './address-key'
import { postcodeAtEnd } from './read-postcode'

export type AddressParts = {
  readonly number: string
  readonly block: string
  readonly street: string
  readonly address: string
  readonly town: string
}

/** Words that end the name of a street or a building: a part with one of them is no town. */
const STREET =
  /\b(?:road|rd|street|st|avenue|ave?|lane|ln|close|cl|court|ct|drive|dr|gardens?|gdns|crescent|cres|terrace|terr?|place|pl|square|sq|grove|house|hse|way|walk|row|yard|hill|rise|view|mews|park|green|quay|wharf|parade|buildings?|bldgs?|villas|cottages?|lodge|tower|mansions|heights|path|bank|mount|street|croft|meadows?|fields?|end|gate|passage|alley|broadway|embankment|esplanade|promenade|ropewalk|the|heol|ffordd|stryd|maes|lon|clos|rhodfa|tai|flats?)\b/i

const lines = (text: string) =>
  text
    .split(/\s*[,\n;]\s*/)
    .map((part) => part.trim())
    .filter(Boolean)

/**
 * A whole address in one cell: the parts after the last one that names a street or bears a number are its town.
 * @example splitTown('4 Lantern Lane, Quillhaven') // { address: '4 Lantern Lane', town: 'Quillhaven' }
 * @example splitTown('Flat 2, Herring Court') // { address: 'Flat 2, Herring Court', town: null }
 */
export function splitTown(text: string): { address: string; town: string | null } {
  const parts = lines(text)
  const isStreet = (part: string) => STREET.test(part.replace(/^(?:flat|apartment|apt|unit)\s+\S+\s*/i, ''))
  const last = parts.findLastIndex((part) => isStreet(part) || /\d/.test(part))
  const named = parts.findIndex(isStreet)
  // "Flat 2, Herringbone": without a street before it, the last part may well be the building.
  if (named < 0 || last < 0 || last === parts.length - 1) return { address: parts.join(', '), town: null }
  return { address: parts.slice(0, last + 1).join(', '), town: parts.slice(last + 1).join(', ') }
}

const isHouseNumber = (text: string) => /^\d+\s?[a-z]?(?:\s?[-/]\s?\d+\s?[a-z]?)?$/i.test(text)

/** "12" goes before a street with a space, "Flat 3" with a comma. */
const joined = (number: string, rest: string) =>
  number === ''
    ? rest
    : rest === ''
      ? number
      : isHouseNumber(number)
        ? `${number} ${rest}`
        : `${number}, ${rest}`

const holds = (whole: string, part: string) => ` ${foldAddress(whole)} `.includes(` ${foldAddress(part)} `)

/**
 * The address as the register keeps it. The block's name is put in where the other columns leave it out and the
 * number alone could be any house in the street.
 * @example composeAddress({ number: 'Flat 3', block: 'Signal House', street: 'Fore Street', address: '', town: '' }).address
 * // 'Flat 3, Signal House, Fore Street'
 */
export function composeAddress(parts: AddressParts): {
  address: string
  town: string | null
  postcode: string | null
} {
  const { number, block, street } = parts
  const { rest, postcode } = postcodeAtEnd(parts.address)
  const whole =
    parts.town === '' && street === ''
      ? splitTown(rest)
      : { address: lines(rest).join(', '), town: parts.town || null }
  const town = whole.town ?? (parts.town || null)
  const withStreet =
    street !== '' && !holds(whole.address, street)
      ? [whole.address, street].filter(Boolean).join(', ')
      : whole.address
  const base = number !== '' && holds(withStreet.slice(0, number.length + 8), number) ? withStreet : ''
  if (base !== '') return { address: base, town, postcode }
  const needsBlock =
    block !== '' && !isHouseNumber(number) && !holds(withStreet, block) && !holds(number, block)
  const tail = needsBlock && number !== '' ? [block, withStreet].filter(Boolean).join(', ') : withStreet
  return { address: joined(number, tail), town, postcode }
}
