/** How each age of building was wired, and what has been done to it since. Shares are invented for the demo. */
import { type Era } from '../town/street'

type Years = readonly [from: number, to: number]
type EraHabit = {
  readonly built: Years
  /** the register knows the year only about */
  readonly about: boolean
  /** wired for the first time, or again, before the landlord had a programme */
  readonly firstWired: Years | null
  /** share of streets that a rewiring programme reached, and when */
  readonly programme: { readonly share: number; readonly years: Years }
  /** share of homes given a new consumer unit since, one at a time */
  readonly newUnit: { readonly share: number; readonly years: Years }
}

export const ERA_HABITS: Record<Era, EraHabit> = {
  medieval: {
    built: [1720, 1870],
    about: true,
    firstWired: [1956, 1974],
    programme: { share: 0.78, years: [1987, 2014] },
    newUnit: { share: 0.34, years: [2009, 2024] },
  },
  victorian: {
    built: [1876, 1906],
    about: true,
    firstWired: [1957, 1974],
    programme: { share: 0.78, years: [1986, 2016] },
    newUnit: { share: 0.36, years: [2006, 2025] },
  },
  interwar: {
    built: [1922, 1938],
    about: false,
    firstWired: [1960, 1972],
    programme: { share: 0.76, years: [1985, 2015] },
    newUnit: { share: 0.34, years: [2005, 2025] },
  },
  postwar: {
    built: [1948, 1963],
    about: false,
    firstWired: null,
    programme: { share: 0.84, years: [1984, 2014] },
    newUnit: { share: 0.32, years: [2005, 2025] },
  },
  sixties: {
    built: [1965, 1976],
    about: false,
    firstWired: null,
    programme: { share: 0.6, years: [1996, 2018] },
    newUnit: { share: 0.4, years: [2003, 2024] },
  },
  eighties: {
    built: [1980, 1990],
    about: false,
    firstWired: null,
    programme: { share: 0.2, years: [2010, 2023] },
    newUnit: { share: 0.42, years: [2006, 2025] },
  },
  millennium: {
    built: [2002, 2019],
    about: false,
    firstWired: null,
    programme: { share: 0, years: [2024, 2025] },
    newUnit: { share: 0.06, years: [2016, 2025] },
  },
  quay: {
    built: [2005, 2018],
    about: false,
    firstWired: null,
    programme: { share: 0, years: [2024, 2025] },
    newUnit: { share: 0.05, years: [2017, 2025] },
  },
}
