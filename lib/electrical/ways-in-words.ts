import { type Way, type WayDevice } from './consumer-unit'

/** One, and more than one, in the order in which they are told. */
const DEVICE_WORDS: Record<WayDevice, readonly [string, string]> = {
  rewireable: ['rewireable', 'rewireable'],
  cartridge: ['cartridge fuse', 'cartridge fuses'],
  breaker: ['breaker', 'breakers'],
  rcbo: ['RCBO', 'RCBOs'],
  blank: ['blank', 'blank'],
  unknown: ['not known', 'not known'],
}

/**
 * The ways of a consumer unit, counted by device.
 * @example waysInWords(waysOf('RRRRRU')) // '6 ways: 5 rewireable, 1 not known'
 */
export function waysInWords(ways: readonly Way[]): string {
  const parts = (Object.keys(DEVICE_WORDS) as WayDevice[]).flatMap((device) => {
    const count = ways.filter((way) => way.device === device).length
    return count === 0 ? [] : [`${count} ${DEVICE_WORDS[device][count === 1 ? 0 : 1]}`]
  })
  return `${ways.length} ${ways.length === 1 ? 'way' : 'ways'}: ${parts.join(', ')}`
}
