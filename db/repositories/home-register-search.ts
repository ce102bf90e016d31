/** The text that a search looks in, and what a typed search asks of it. Pure; both sides fold alike. */
import { foldWords } from '@/lib/imports/fold-words'

const close = (folded: string) => folded.replaceAll(' ', '')
const MOST = 600

/**
 * The search text of a home: its words, and its postcode, UPRN and reference without spaces too, each
 * word with a space before it, so that " 12" finds what begins with 12.
 * @example searchTextOf({ address: '1 Herring Row', town: null, postcode: 'ZX1 2AB', uprn: null, reference: 'Q-7' })
 * // ' 1 herring row zx1 2ab zx12ab q 7 q7 '
 */
export function searchTextOf(home: {
  address: string
  town: string | null
  postcode: string | null
  uprn: string | null
  reference: string | null
}): string {
  const postcode = foldWords(home.postcode ?? '')
  const reference = foldWords(home.reference ?? '')
  const words = [
    foldWords(home.address),
    foldWords(home.town ?? ''),
    postcode,
    close(postcode),
    home.uprn ?? '',
    reference,
    close(reference),
  ]
  return ` ${[...new Set(words)].filter(Boolean).join(' ')} `.slice(0, MOST)
}

/**
 * What begins with a figure, or is one or two letters, must begin a word: house 12 is not house 112, nor the middle
 * of a UPRN. Folded words are letters and figures alone, so none of LIKE's own signs is among them.
 */
const pattern = (word: string) => (/^(\p{N}|.{1,2}$)/u.test(word) ? `% ${word}%` : `%${word}%`)

/** No search text holds a bar, so this finds nothing. */
const NOTHING = '|'

/** A UPRN that kept its leading zeros on paper is kept here as a number. */
const bare = (digits: string) => (/^0\d{5,}$/.test(digits) ? digits.replace(/^0+/, '') : digits)

/**
 * What a search asks for: every one of `all`, or else `whole`, the search run together, so that a UPRN,
 * a reference or a postcode is found in any spacing; null where that could find nothing more. Null where
 * nothing was typed; a search of nothing but marks finds nothing.
 * @example searchPatterns('12 herring') // { all: ['% 12%', '%herring%'], whole: '% 12herring%' }
 * @example searchPatterns('herring') // { all: ['%herring%'], whole: null }
 */
export function searchPatterns(search: string): { all: readonly string[]; whole: string | null } | null {
  if (search.trim() === '') return null
  const folded = foldWords(search)
  if (folded === '') return { all: [NOTHING], whole: null }
  const words = folded.split(' ')
  const whole = bare(close(folded))
  return { all: words.map(pattern), whole: words.length > 1 || whole !== folded ? `% ${whole}%` : null }
}

/** A page's cursor carries the key, so it is kept short in bytes too. */
const isPlain = (key: string) => /^[a-z0-9 ]*$/.test(key)

/**
 * The text that homes are put in order of address by: street, then town, then number, so that a street
 * stays together and 9 comes before 10.
 * @example addressSortOf('Flat 3, 12 Herring Row', 'Quillhaven') // 'herring row quillhaven 000012 flat 000003'
 */
export function addressSortOf(address: string, town: string | null): string {
  const parts = address.split(',').map((part) => part.trim())
  const at = parts.findIndex((part) => /^\d/.test(part) && /\p{L}{2}/u.test(part))
  const [, number = '', street = ''] = /^(\d\S*(?:\s*[-–]\s*\d\S*)?)\s+(.*)$/.exec(parts[at] ?? '') ?? []
  const ordered =
    street === ''
      ? [address, town ?? '']
      : [street, ...parts.slice(at + 1), town ?? '', number, ...parts.slice(0, at)]
  const key = foldWords(ordered.join(' ')).replace(/\d+/g, (digits) => digits.padStart(6, '0'))
  return key.slice(0, isPlain(key) ? 220 : 70)
}
