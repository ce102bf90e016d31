import { type BoardType } from '@/lib/homes/board-type'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { boardWords, devicesIn } from './board-words'
import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

/** `cover` is what the words also tell of RCD cover; it counts only where the list has no column for that. */
export type BoardReading = { readonly boardType: BoardType; readonly cover: RcdCover | null }

const board = (boardType: BoardType, cover: RcdCover | null, note: string | null = null) =>
  found<BoardReading>({ boardType, cover }, note)

function coverIn(words: string): RcdCover | null {
  if (/\b(?:no|without|non|not|lacks?|w o)(?: any)? rcd/.test(words)) return 'none'
  if (/\b(?:all|full|fully) rcbos?\b|\brcbos? (?:on )?(?:all|throughout)\b/.test(words)) return 'all'
  if (/\brcd (?:main ?switch|incomer|main)\b|\b(?:main ?switch|front end|up ?front) rcd\b/.test(words))
    return 'all'
  if (/\brcd.*\b(?:sockets?|skts?)\b|\b(?:sockets?|skts?)\b.*\brcd/.test(words)) return 'sockets'
  return /\brcds?\b|\bsplit ?(?:load|board)\b/.test(words) ? 'part' : null
}

/**
 * What protects the circuits of a home, from the words of the trade.
 * A kind that the words leave open ("old fuse box", "metal-clad consumer unit") is not known, with a note.
 * @example readBoardType('re-wireable fuses') // rewireable
 * @example readBoardType('breakers with one RCD') // breakers, cover part
 * @example readBoardType('Mixed MCB / rewireable') // mixed
 */
export function readBoardType(cell: Cell): Reading<BoardReading> {
  if (isErrorCell(cell)) return wrong('formula error')
  const text = cellText(cell)
  if (saysUnknown(text)) return board('unknown', null)
  const words = boardWords(foldWords(text))
  const devices = devicesIn(words)
  const cover = coverIn(words)
  const has = (device: (typeof devices)[number]) => devices.includes(device)
  // A question mark after the type is a guess, and a guess is not known.
  if (/\?\s*$|^\s*(?:poss|prob|maybe|may be|think)/i.test(text))
    return board('unknown', null, 'consumer unit only guessed at')
  if (has('rewireable'))
    return board(
      devices.length > 1 || /\b(?:mixed|some|part|partly)\b/.test(words) ? 'mixed' : 'rewireable',
      cover,
    )
  if (has('cartridge'))
    return board('cartridge', cover, devices.length > 1 ? 'cartridge fuses and other devices' : null)
  if (has('breakers') && has('rcbo')) return board('breakers', cover ?? 'part', 'RCBOs on some ways')
  if (has('rcbo'))
    return /\b(?:mixed|some|part|partly)\b/.test(words)
      ? board('unknown', 'part', 'RCBOs on some ways')
      : board('rcbo', cover)
  if (has('breakers')) return board('breakers', cover)
  if (/\bsplit ?load\b|\b(?:dual|twin|double|two|2) rcd\b/.test(words))
    return board('breakers', cover ?? 'part')
  return board('unknown', cover, 'consumer unit not understood')
}
