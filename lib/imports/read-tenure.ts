import { type Tenure } from '@/lib/homes/tenure'
import { type Cell } from './cell'
import { cellText, isErrorCell } from './cell-text'
import { foldWords, saysUnknown } from './fold-words'
import { found, type Reading, wrong } from './reading'

/** In the order of trying: "affordable" before "rent", an assured shorthold before other assured tenancies. */
const TENURES: readonly (readonly [Exclude<Tenure, 'unknown'>, RegExp])[] = [
  [
    'shared-ownership',
    /\bshared (?:ownership|owners?|equity)\b|^s ?o$|\bpart (?:buy|own)\w*\b|\bshared own\w*\b/,
  ],
  ['leasehold', /\blease ?hold(?:ers?)?\b|^lh$|\blong lease\b|\blessee\b|\bright to buy\b|^rtb\b/],
  ['affordable-rent', /\baffordable\b|^ar$|\baff rent\b/],
  ['market-rent', /\bmarket\b|^mr$|\bcommercial rent\b/],
  [
    'private-rent',
    /\bprivate(?:ly)?\b|^prs$|^prt?$|\bassured short ?hold\b|\bast\b|\bstandard (?:occupation )?contract\b/,
  ],
  [
    'social-rent',
    /\bsocial\b|^sr$|\bgeneral needs\b|^gn$|\bsecure\b|\bassured\b|\bintroductory\b|\bstarter\b|\bsheltered\b|\bsupported\b|\bcouncil\b|^hra$|\bextra care\b|\bfor older\b/,
  ],
]

/**
 * How a home is held. Words that could be more than one tenure leave it not known, with a note.
 * @example readTenure('General needs') // 'social-rent'
 * @example readTenure('S/O') // 'shared-ownership'
 */
export function readTenure(cell: Cell): Reading<Tenure> {
  if (isErrorCell(cell)) return wrong('formula error')
  const text = cellText(cell)
  if (saysUnknown(text)) return found('unknown')
  const words = foldWords(text)
  if (/\bintermediate\b|\brent to buy\b/.test(words)) return found('unknown', 'tenure not understood')
  const tenure = TENURES.find(([, pattern]) => pattern.test(words))?.[0]
  return tenure ? found(tenure) : found('unknown', 'tenure not understood')
}
