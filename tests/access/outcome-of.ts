import { type Row } from './matrix'
import { type Somebody } from './everybody'

export type Outcome = 'let in' | 'asked to sign in' | 'hidden' | 'refused'

/**
 * What a row says will happen to somebody.
 * @example outcomeOf({ lets: ['manager'] }, 'auditor') // 'refused'
 */
export function outcomeOf(row: Row, somebody: Somebody): Outcome {
  if (row.lets.includes(somebody)) return 'let in'
  if (somebody === 'signed out') return 'asked to sign in'
  return row.hides?.includes(somebody) ? 'hidden' : 'refused'
}
