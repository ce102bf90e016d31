/** The statutory bands of a harm score: ten letters since 2005, three words in England since June 2026. */
import { type CalendarDay, calendarDay } from '@/lib/calendar/calendar-day'
import { type Nation } from '@/lib/homes/nation'

export type BandEdition = '2005' | 'england-2026'
export type BandLetter = 'A' | 'B' | 'C' | 'D' | 'E' | 'F' | 'G' | 'H' | 'I' | 'J'
export type BandName = BandLetter | 'High' | 'Medium' | 'Low'

/** One band: it runs from `from` up to the next band's. */
export type BandEdge = { readonly name: BandName; readonly from: number }

export type Band = {
  readonly name: BandName
  readonly edition: BandEdition
  /** category 1 obliges a local authority to act */
  readonly category: 1 | 2
  /** true where the nation's law does not use the method, and the band is shown to compare by */
  readonly comparison: boolean
}

/** @source edges from memory, agreeing with every banded sheet seen; the category line at 1,000 from councils */
const LETTERS: readonly BandEdge[] = [
  { name: 'J', from: 0 },
  { name: 'I', from: 10 },
  { name: 'H', from: 20 },
  { name: 'G', from: 50 },
  { name: 'F', from: 100 },
  { name: 'E', from: 200 },
  { name: 'D', from: 500 },
  { name: 'C', from: 1_000 },
  { name: 'B', from: 2_000 },
  { name: 'A', from: 5_000 },
]

/** @source Housing Health and Safety Rating System (England) (Amendment) Regulations 2026, as commented on */
const WORDS: readonly BandEdge[] = [
  { name: 'Low', from: 0 },
  { name: 'Medium', from: 100 },
  { name: 'High', from: 1_000 },
]

/** @source SI 2005/3208 and SI 2006/1702 (W.164); unchanged in 2026 */
export const CATEGORY_1_FROM = 1_000

/**
 * Inspections begun on this day or later are banded in the words of 2026.
 * @source two commentators on the Regulations of 2026; two others and a council name the day after
 */
export const ENGLAND_WORDS_FROM: CalendarDay = calendarDay('2026-06-22')

function editionOf(nation: Nation, inspectionBegun?: CalendarDay): BandEdition {
  if (nation === 'wales') return '2005'
  if (nation === 'england' && inspectionBegun !== undefined && inspectionBegun < ENGLAND_WORDS_FROM)
    return '2005'
  return 'england-2026'
}

/** Whether the nation's own law rates homes by this method. Scotland and Northern Ireland have other standards. */
export const usesHazardBands = (nation: Nation): boolean => nation === 'england' || nation === 'wales'

/**
 * The bands under a range bar's axis, lowest first.
 * @example bandEdges('england').map((band) => band.from) // [0, 100, 1000]
 */
export function bandEdges(nation: Nation, inspectionBegun?: CalendarDay): readonly BandEdge[] {
  return editionOf(nation, inspectionBegun) === '2005' ? LETTERS : WORDS
}

/**
 * The band of a score. The score is compared unrounded with the lower edges, for the published edges leave no gap
 * between 999 and 1,000 for a score of 999.6 to fall in. Without the day on which an inspection began, the bands
 * are those in force now.
 * @throws RangeError where the score is not a number from 0 upwards
 * @example bandOf(1034.76, 'wales') // { name: 'C', edition: '2005', category: 1, comparison: false }
 * @example bandOf(120, 'scotland').comparison // true
 */
export function bandOf(score: number, nation: Nation, inspectionBegun?: CalendarDay): Band {
  if (!(score >= 0)) throw new RangeError(`Not a score: ${score}`)
  const edition = editionOf(nation, inspectionBegun)
  const band = bandEdges(nation, inspectionBegun).findLast(({ from }) => score >= from) as BandEdge
  return {
    name: band.name,
    edition,
    category: score >= CATEGORY_1_FROM ? 1 : 2,
    comparison: !usesHazardBands(nation),
  }
}
