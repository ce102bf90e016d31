/** An address reduced to what tells one home from another, so that the same home is found however it was typed. */
import { foldWords } from './fold-words'

/** Words for streets and dwellings, each brought to its short form. Common practice, no source. */
const SHORT: Readonly<Record<string, string>> = {
  road: 'rd', street: 'st', saint: 'st', avenue: 'ave', av: 'ave', lane: 'ln', close: 'cl', court: 'ct', crt: 'ct',
  drive: 'dr', drv: 'dr', gardens: 'gdns', garden: 'gdns', gdn: 'gdns', crescent: 'cres', cresent: 'cres', terrace: 'ter',
  terr: 'ter', place: 'pl', square: 'sq', grove: 'gr', grv: 'gr', mount: 'mt', apartment: 'flat', apt: 'flat',
  house: 'hse', building: 'bldg', buildings: 'bldg', bldgs: 'bldg', walk: 'wlk', way: 'wy', north: 'n', south: 's',
  east: 'e', west: 'w', first: '1st', second: '2nd', third: '3rd', ground: 'gnd', number: 'no',
} // prettier-ignore
const LONGEST = 220

/**
 * The words of an address without case, punctuation and accents, street words shortened, "12 A" joined to "12a".
 * @example foldAddress('Flat 2, Herring Court') // 'flat 2 herring ct'
 * @example foldAddress('No. 7 Cooper’s Road') // '7 coopers rd'
 */
export function foldAddress(text: string): string {
  return foldWords(text)
    .split(' ')
    .map((word) => (Object.hasOwn(SHORT, word) ? (SHORT[word] ?? word) : word.replace(/^0+(?=\d)/, '')))
    .join(' ')
    .replaceAll(/\b(?:no )+(?=\d)/g, '')
    .replaceAll(/(?<![^ ])(\d+) ([a-z])(?![^ ])/g, '$1$2')
}

/**
 * The key of a home: its folded address, and its postcode or, where it has none, its town. The landlord's supply of a
 * block has the block's address, so its key says that it is communal.
 * @example addressKey({ address: '4 Lantern Lane', town: 'Quillhaven', postcode: 'ZX2 3QT', kind: 'dwelling' }) // '4 lantern ln|ZX23QT'
 */
export function addressKey(home: {
  address: string
  town: string | null
  postcode: string | null
  kind: 'dwelling' | 'communal'
}): string {
  const place = home.postcode?.replace(' ', '') ?? foldAddress(home.town ?? '')
  const mark = home.kind === 'communal' ? 'communal|' : ''
  return `${mark}${foldAddress(home.address)}|${place}`.slice(0, LONGEST)
}
