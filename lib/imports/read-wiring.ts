import { type Wiring } from '@/lib/homes/wiring'
import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

/** Common practice, no source: VIR is vulcanised rubber, TRS and CTS tough rubber or cab-tyre sheath, MICC mineral. */
const KINDS: readonly (readonly [Exclude<Wiring, 'mixed' | 'unknown'>, RegExp])[] = [
  ['pvc', /\bpvcs?\b|\bt (?:and )?e\b|\btwin (?:and )?earth\b|\bthermoplastic\b|\b6242y\b/],
  ['rubber', /\brubber\b|\bv ?i ?r\b|\bt ?r ?s\b|\bc ?t ?s\b|\bvulcani[sz]ed\b|\bcab ty[rp]e\b/],
  ['lead', /\blead\b/],
  ['mineral', /\bmineral\b|\bmicc\b|\bmi\b|\bmims\b|\bpyro\b/],
]

/**
 * The insulation of the fixed wiring.
 * @example readWiring('VIR') // 'rubber'
 * @example readWiring('part PVC, part rubber') // 'mixed'
 */
export function readWiring(cell: Cell): Reading<Wiring> {
  if (isErrorCell(cell)) return wrong('formula error')
  const text = cellText(cell)
  if (saysUnknown(text)) return found('unknown')
  if (/\?\s*$/.test(text)) return found('unknown', 'wiring only guessed at')
  const words = foldWords(text)
  const kinds = KINDS.filter(([, pattern]) => pattern.test(words)).map(([kind]) => kind)
  if (kinds.length > 1 || /\b(?:mixed|mixture|various)\b/.test(words)) return found('mixed')
  return kinds[0] ? found(kinds[0]) : found('unknown', 'wiring not understood')
}
