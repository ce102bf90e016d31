/** Text reduced to its words, so that slang is recognised however it is spelt out. */

const PLAIN = /^[A-Za-z0-9 !#$%()*+,./:;<=>?@[\\\]^_{|}~-]*$/
const NO_WORD = /[^a-z0-9]+/g

/**
 * Lower case, without accents, apostrophes and punctuation; words parted by one space.
 * @example foldWords('Re-wireable  Fuses (BS3036)') // 're wireable fuses bs3036'
 * @example foldWords('P’code') // 'pcode'
 */
export function foldWords(text: string): string {
  // Most cells hold plain letters, and a list of 100,000 homes folds millions of them: they take the short way.
  if (PLAIN.test(text)) return text.toLowerCase().replaceAll(NO_WORD, ' ').trim()
  return text
    .normalize('NFKD')
    .replaceAll(/\p{M}/gu, '')
    .toLowerCase()
    .normalize('NFKD')
    .replaceAll(/\p{M}/gu, '')
    .replaceAll(/['’‘`´]/g, '')
    .replaceAll('&', ' and ')
    .replaceAll(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()
}

const UNKNOWN = new Set(
  `n k,nk,n a,na,not applicable,tbc,tbd,tba,unknown,unkown,unk,not known,not sure,unsure,dont know,do not know,
  no info,no information,no data,not available,not recorded,not stated,not surveyed,not determined,missing,null,
  undefined,to be confirmed,to confirm,to be checked,to check,check,query,see notes,blank,x,xx,xxx`
    .split(',')
    .map((phrase) => phrase.trim()),
)

/** Words may follow these: "unknown - no access". */
const UNKNOWN_START = /^(?:not known|unknown|tbc|not sure)\b/i
const LONGEST_UNKNOWN = 24

/**
 * Whether text says that something is not known: blank, a question mark, "n/k", "TBC", "not sure".
 * @example saysUnknown('N/K') // true
 * @example saysUnknown('none') // false
 */
export function saysUnknown(text: string): boolean {
  if (text.length > LONGEST_UNKNOWN && /[\p{L}\p{N}]/u.test(text) && !UNKNOWN_START.test(text)) return false
  const words = foldWords(text)
  return words === '' || UNKNOWN.has(words) || UNKNOWN_START.test(words)
}
