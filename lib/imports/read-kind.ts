import { type Cell } from './cell'
import { cellText } from './cell-text'
import { foldWords } from './fold-words'
import { saysCommunal } from './read-dwelling-type'

/**
 * Whether a row is a dwelling or the landlord's supply of a block.
 * @example readKind('Landlord supply') // 'communal'
 */
export const readKind = (cell: Cell): 'dwelling' | 'communal' =>
  saysCommunal(cell) || /^(?:block|landlords?|common(?: areas?)?)$/.test(foldWords(cellText(cell)))
    ? 'communal'
    : 'dwelling'
