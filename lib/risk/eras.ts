/** The times that a home was built in or wired in, cut where the trade changed what it fitted. */
import { type YearBuilt } from '@/lib/homes/year-built'
import { type AgeBand } from './national-averages'

type Era = { readonly key: string; readonly from: number; readonly ageBand: AgeBand }

/**
 * When a home was built, oldest first; each runs up to the next.
 * @source cuts of the averages at 1920, 1946 and 1980; rubber gives way to PVC by the middle of the 1960s, breakers
 *   become usual from the 1990s (editions of the Wiring Regulations 1966, 1991 and 2008; trade accounts)
 */
export const ERAS = [
  { key: 'before-1920', from: 1850, ageBand: 'pre-1920' },
  { key: '1920-45', from: 1920, ageBand: '1920-45' },
  { key: '1946-65', from: 1946, ageBand: '1946-79' },
  { key: '1966-79', from: 1966, ageBand: '1946-79' },
  { key: '1980-91', from: 1980, ageBand: 'post-1979' },
  { key: '1992-2007', from: 1992, ageBand: 'post-1979' },
  { key: '2008-on', from: 2008, ageBand: 'post-1979' },
] as const satisfies readonly Era[]
export type EraKey = (typeof ERAS)[number]['key']

/** When the wiring was put in, oldest first. `typical` is the year whose age is taken where only the time is guessed. */
export const WIRING_PERIODS = [
  { key: 'before-1946', from: 1900, typical: 1936 },
  { key: '1946-65', from: 1946, typical: 1957 },
  { key: '1966-79', from: 1966, typical: 1973 },
  { key: '1980-91', from: 1980, typical: 1985 },
  { key: '1992-2007', from: 1992, typical: 1999 },
  { key: '2008-on', from: 2008, typical: 2014 },
] as const
export type WiringPeriodKey = (typeof WIRING_PERIODS)[number]['key']

/** Where a year falls in a list that is cut by its `from`s; the first where it is earlier than all. */
function placeOf(list: readonly { readonly from: number }[], year: number): number {
  let place = list.length - 1
  while (place > 0 && year < (list[place] as { from: number }).from) place -= 1
  return place
}

export const eraOf = (year: number): number => placeOf(ERAS, year)
export const wiringPeriodOf = (year: number): number => placeOf(WIRING_PERIODS, year)

/** A home built in this era or later is taken to have the wiring it was built with, unless a rewire is on record. */
export const ORIGINAL_WIRING_FROM_ERA = 6

/**
 * How likely each era is for a year that is known as an interval: by years of overlap where both ends are known,
 * by the stock of each era where an end is open.
 * @param stock share of homes by era, in the order of ERAS
 * @param thisYear a home cannot be newer
 * @returns weights in the order of ERAS, adding to 1
 * @example eraWeights({ from: 1940, to: 1949, about: false }, stock, 2026) // [0, 0.6, 0.4, 0, 0, 0, 0]
 */
export function eraWeights({ from, to }: YearBuilt, stock: readonly number[], thisYear: number): number[] {
  const last = Math.max(thisYear, 2008)
  const low = from ?? Number.NEGATIVE_INFINITY
  const high = to ?? Number.POSITIVE_INFINITY
  const open = from === null || to === null
  const raw = ERAS.map((era, i) => {
    const start = i === 0 ? Math.min(era.from, Number.isFinite(low) ? low : era.from) : era.from
    const end = ERAS[i + 1]
      ? (ERAS[i + 1] as Era).from - 1
      : Math.max(last, Number.isFinite(high) ? high : last)
    const years = Math.min(high, end) - Math.max(low, start) + 1
    if (years <= 0) return 0
    return open ? ((stock[i] ?? 0) * years) / (end - start + 1) : years
  })
  const total = raw.reduce((sum, weight) => sum + weight, 0)
  if (total > 0) return raw.map((weight) => weight / total)
  const only = eraOf(from ?? to ?? last)
  return ERAS.map((_, i) => (i === only ? 1 : 0))
}
