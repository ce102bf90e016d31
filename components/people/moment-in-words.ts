import { tz } from '@date-fns/tz'
import { format } from 'date-fns'

const LONDON = tz('Europe/London')

/**
 * The day of a moment in London, in words.
 * @param moment [ISO 8601]
 * @example momentInWords('2026-12-01T23:30:00Z') // '1 December 2026'
 */
export const momentInWords = (moment: string): string =>
  format(new Date(moment), 'd MMMM yyyy', { in: LONDON })
