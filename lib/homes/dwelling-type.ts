/** The shape of a dwelling. */
export const DWELLING_TYPES = [
  'detached',
  'semi-detached',
  'end-terrace',
  'mid-terrace',
  'bungalow',
  'flat',
  'maisonette',
  'bedsit',
  'unknown',
] as const
export type DwellingType = (typeof DWELLING_TYPES)[number]

export const DWELLING_TYPE_NAMES: Record<DwellingType, string> = {
  detached: 'Detached house',
  'semi-detached': 'Semi-detached house',
  'end-terrace': 'End terrace',
  'mid-terrace': 'Mid terrace',
  bungalow: 'Bungalow',
  flat: 'Flat',
  maisonette: 'Maisonette',
  bedsit: 'Bedsit',
  unknown: 'Not known',
}
