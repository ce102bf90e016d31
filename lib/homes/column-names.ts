import { type Column } from './home-query'

/** What each column of the homes list is called, on screen and in a file. */
export const COLUMN_NAMES: Record<Column, string> = {
  board: 'Consumer unit',
  cover: 'RCD cover',
  built: 'Built',
  inspected: 'Last inspection',
  standing: 'Standing',
  defects: 'Open defects',
  score: 'Score',
  patch: 'Patch',
  block: 'Block',
  tenure: 'Tenure',
  type: 'Dwelling',
  wiring: 'Wiring',
  rewired: 'Rewired',
  bedrooms: 'Bedrooms',
  reference: 'Reference',
  uprn: 'UPRN',
  nation: 'Nation',
}
