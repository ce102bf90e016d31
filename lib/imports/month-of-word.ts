const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'] as const
const FULL = 'january february march april may june july august september october november december'.split(
  ' ',
)

/**
 * The month [1 to 12] that a word names in full or by its first letters; null where it names none.
 * @example monthOfWord('Sept') // 9
 */
export function monthOfWord(word: string): number | null {
  const folded = word.toLowerCase().replace('.', '')
  const at = MONTHS.indexOf(folded.slice(0, 3) as (typeof MONTHS)[number])
  return at >= 0 && FULL[at]?.startsWith(folded) ? at + 1 : null
}
