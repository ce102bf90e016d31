import { type Nation } from '@/lib/homes/nation'
import { type Cell } from './cell'
import { cellText } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

const NATIONS: readonly (readonly [Nation, RegExp])[] = [
  ['england', /^eng(?:land|lish)?\b/],
  ['wales', /^(?:wales|welsh|cymru|wal)\b/],
  ['scotland', /^(?:scot(?:land|tish)?|alba|sco)\b/],
  ['northern-ireland', /^(?:northern ireland|n ?i|n ireland|nir)\b/],
]

/**
 * The nation whose law governs a home, or null where the row does not say. A word that names none is refused:
 * a wrong nation would be a wrong law.
 * @example readNation('Cymru') // 'wales'
 */
export function readNation(cell: Cell): Reading<Nation | null> {
  const text = cellText(cell)
  if (saysUnknown(text)) return found(null)
  const nation = NATIONS.find(([, pattern]) => pattern.test(foldWords(text)))?.[0]
  return nation ? found(nation) : wrong('nation not known')
}
