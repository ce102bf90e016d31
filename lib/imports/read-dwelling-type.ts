import { type DwellingType } from '@/lib/homes/dwelling-type'
import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

/** In the order of trying: a bungalow may stand in a terrace, a studio may be called a flat. */
const TYPES: readonly (readonly [DwellingType, RegExp])[] = [
  ['bungalow', /\bbun+g?[ao]?l?ow?s?\b|\bbung\b|\bbungalows?\b/],
  ['bedsit', /\bbed ?sit(?:ter)?s?\b|\bstudios?\b/],
  ['maisonette', /\bmai?son+ett?es?\b|\bmasion+ett?es?\b|\bmais\b/],
  [
    'flat',
    /\bflats?\b|\bapartments?\b|\bapts?\b|\bpenthouse\b|\bgff\b|\bfff\b|\bhigh rise\b|\blow rise\b|\btower block\b/,
  ],
  ['semi-detached', /\bsemi\b|\bsemis\b|\bsemi ?det\w*\b|\bsd\b|\bs d\b/],
  [
    'end-terrace',
    /\bend(?: of)?(?: the)?(?: ?link)? ?terr\w*\b|\bterraced? end\b|\bend ?ter\b|\bet\b|\beot\b|\bend town ?house\b/,
  ],
  [
    'mid-terrace',
    /\bmid ?(?:link)? ?terr\w*\b|\bterraced? mid\b|\bmid ?ter\b|\bmiddle terr\w*\b|\bmt\b|\binner terr\w*\b|\bmid town ?house\b/,
  ],
  ['detached', /\bdet(?:ached)?\b/],
]
const NO_HOME =
  /\b(?:garages?|parking|car ?port|shops?|offices?|commercial|retail|community (?:centre|room|hall)|store(?:s|room)?|land|plot)\b/
const COMMUNAL =
  /\b(?:communal|landlords? (?:supply|supplies)|common parts?|block supply|stairwell|stair lighting)\b/

/** Whether the words name the supply of a block's common parts rather than a dwelling. */
export const saysCommunal = (cell: Cell | undefined): boolean => COMMUNAL.test(foldWords(cellText(cell)))

/**
 * The shape of a dwelling. "House" or "terraced" leaves it open, so it is not known, with a note.
 * @example readDwellingType('end terrace') // 'end-terrace'
 * @example readDwellingType('Garage') // why: 'not a home'
 */
export function readDwellingType(cell: Cell): Reading<DwellingType> {
  if (isErrorCell(cell)) return wrong('formula error')
  const text = cellText(cell)
  if (saysUnknown(text) || saysCommunal(cell)) return found('unknown')
  const words = foldWords(text)
  const type = TYPES.find(([, pattern]) => pattern.test(words))?.[0]
  if (type) return found(type)
  if (NO_HOME.test(words) && !/\bhouses?\b|\bhomes?\b|\bcottage\b/.test(words)) return wrong('not a home')
  return found('unknown', 'dwelling type not understood')
}
