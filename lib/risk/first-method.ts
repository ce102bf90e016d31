/** The method that a new organisation starts with. A change to any figure here is a new version. */
import { FIRST_BELIEFS } from './first-beliefs'
import { FIRST_SHIFTS } from './first-shifts'
import { type Method } from './method'
import { NATIONAL_AVERAGES } from './national-averages'

export const FIRST_METHOD: Method = {
  version: '1',
  averages: NATIONAL_AVERAGES,
  shifts: FIRST_SHIFTS,
  spreads: {
    electrical: {
      // one sheet rates an example at 1 in 10 in band B, so its spread weighs 20,000 to under 50,000; of those
      // hurt by current at home in 2002 about 1 % died (27 of 2,788), and a child under 5 is taken to fare worse
      spread: [2.2, 10, 21.5, 66.3],
      basis: 'judgement',
      source: 'Within the bounds of a worked example at 1 in 10, band B',
    },
    fire: {
      // one sheet prints an average of 1 in 5,701 and its score, 17, so the spread weighs 94,067 to 99,767
      spread: [8.5, 8.5, 10, 73],
      basis: 'judgement',
      source: 'Within the bounds of a printed average, 1 in 5,701 and score 17',
    },
  },
  share: {
    electrical: { part: 1, basis: 'published', source: 'The whole hazard' },
    fire: {
      part: 0.534,
      basis: 'published',
      source: '53.4 % of accidental dwelling fires in England 2018-19 were electrical (Home Office figures)',
    },
  },
  usualTermYears: 5,
  beliefs: FIRST_BELIEFS,
}
