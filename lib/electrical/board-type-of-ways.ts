import { type BoardType } from '@/lib/homes/board-type'
import { type Way } from './consumer-unit'

/**
 * The board type that the ways show. One rewireable way beside others makes a mixed board; without any,
 * the oldest kind of device names it. Where a way is not known and none is rewireable, neither is the type:
 * the unknown way could be a rewireable one.
 * @example boardTypeOfWays(waysOf('RRBB')) // 'mixed'
 * @example boardTypeOfWays(waysOf('BBO')) // 'breakers'
 * @example boardTypeOfWays(waysOf('BBU')) // 'unknown'
 */
export function boardTypeOfWays(ways: readonly Way[]): BoardType {
  const devices = new Set(ways.map((way) => way.device))
  const others = devices.has('cartridge') || devices.has('breaker') || devices.has('rcbo')
  if (devices.has('rewireable')) return others ? 'mixed' : 'rewireable'
  if (devices.has('unknown')) return 'unknown'
  if (devices.has('cartridge')) return 'cartridge'
  if (devices.has('breaker')) return 'breakers'
  return devices.has('rcbo') ? 'rcbo' : 'unknown'
}
