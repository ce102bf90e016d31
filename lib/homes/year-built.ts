/** The year a home was built, as an interval of years: people write 1931, "1960s", "c.1900", "pre-war". */

/** First and last year that it could be; both null where nothing is known. `about` keeps a "circa". */
export type YearBuilt = { readonly from: number | null; readonly to: number | null; readonly about: boolean }

export const UNKNOWN_YEAR: YearBuilt = { from: null, to: null, about: false }

/**
 * The interval in words.
 * @example yearBuiltInWords({ from: 1960, to: 1969, about: false }) // '1960 to 1969'
 * @example yearBuiltInWords({ from: 1895, to: 1905, about: true }) // 'about 1900'
 */
export function yearBuiltInWords({ from, to, about }: YearBuilt): string {
  if (from === null && to === null) return 'not known'
  if (from === null) return `before ${(to as number) + 1}`
  if (to === null) return `${from} or later`
  if (from === to) return about ? `about ${from}` : String(from)
  return about ? `about ${Math.round((from + to) / 2)}` : `${from} to ${to}`
}
