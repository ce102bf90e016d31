import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type Way } from './consumer-unit'

/**
 * The RCD cover that the ways show: a way is covered behind an RCD or by an RCBO of its own. Blank ways do
 * not count. Where nothing shows an RCD the answer is `unknown`, not `none`: a code may be written by
 * somebody who counted the ways and did not look for an RCD, and one may stand outside the board.
 * @example rcdCoverOfWays(waysOf('[BBBB]OO')) // 'all'
 * @example rcdCoverOfWays(waysOf('RRR[BB]')) // 'part'
 * @example rcdCoverOfWays(waysOf('RRRR')) // 'unknown'
 */
export function rcdCoverOfWays(ways: readonly Way[]): Extract<RcdCover, 'all' | 'part' | 'unknown'> {
  const used = ways.filter((way) => way.device !== 'blank')
  const covered = used.filter((way) => way.behindRcd > 0 || way.device === 'rcbo')
  if (covered.length === 0) return 'unknown'
  return covered.length === used.length ? 'all' : 'part'
}
