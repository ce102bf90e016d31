import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

const PART_OF =
  /\b(?:part|partial|partly|some|most|split|not all|except|excluding|apart from|shower|cooker|garage|outside|upstairs|downstairs|kitchen|one|single|dual|twin|two|half)\b|\ball (?:power|but)\b/
const SOCKETS = /\b(?:sockets?|socket outlets?|skts?|sckts?|ring(?: main| final)?s?)\b/
/** Not all of the sockets. */
const SOME = /\b(?:some|most|few|one|kitchen|upstairs|downstairs|outside|garage)\b/
const MORE = /\b(?:lights?|lighting|shower|cooker|immersion)\b/
const ALL =
  /\b(?:all|full|fully|whole|entire|every|both|100|complete|throughout|main ?switch|incomer|front end|up ?front)\b|\brcbos?\b/
const NONE =
  /^(?:no|none|n|nil|not (?:fitted|present|protected|installed)|absent|without|false|0|nothing|not (?:rcd )?protected|un ?protected)\b(?! (?:all|info|data|record))/
const YES =
  /^(?:y|yes|true|1|present|fitted|installed|rcd|rcds|rcd (?:fitted|present|protected|board)|30 ?ma(?: rcd)?|rccb|elcb|[1-4]|has rcd|protected)$/
/** A device of 100 mA or more guards against fire, not against shock. @source BS 7671 regulation 415.1.1: 30 mA */
const COARSE = /\b(?:100|300|500) ?ma\b/

const some = (cover: RcdCover, note: string | null = null) => found(cover, note)

/**
 * How far RCD protection reaches. A bare "yes" tells that there is some, so it is read as part, with a note.
 * @example readRcdCover('Y - all ccts') // 'all'
 * @example readRcdCover('skts') // 'sockets'
 * @example readRcdCover('yes') // 'part' with the note 'RCD said to be there, how far not given'
 */
export function readRcdCover(cell: Cell): Reading<RcdCover> {
  if (isErrorCell(cell)) return wrong('formula error')
  const text = cellText(cell)
  const words = foldWords(text)
  if (saysUnknown(text) || /^no (?:info|data|record|access|idea)\b/.test(words)) return some('unknown')
  if (/\?\s*$/.test(text)) return some('unknown', 'RCD cover only guessed at')
  if (COARSE.test(words) && !/\b30 ?ma\b/.test(words))
    return some('unknown', 'RCD too coarse to guard against shock')
  if (NONE.test(words)) return some('none')
  if (SOCKETS.test(words)) {
    if (/\bno$/.test(words)) return some('unknown', 'RCD cover not understood')
    return some(SOME.test(words) || (MORE.test(words) && !/\bonly\b/.test(words)) ? 'part' : 'sockets')
  }
  if (PART_OF.test(words)) return some('part')
  if (ALL.test(words)) return some('all')
  if (YES.test(words)) return some('part', 'RCD said to be there, how far not given')
  return some('unknown', 'RCD cover not understood')
}
