/** Chance that comes out the same every time, so that the demo is the same town and the same homes on every machine. */

export type SeededRandom = {
  /** at least 0, below 1 */
  readonly next: () => number
  /** a whole number from `from` to `to`, both included */
  readonly whole: (from: number, to: number) => number
  /** a number from `from` up to `to` */
  readonly between: (from: number, to: number) => number
  readonly chance: (share: number) => boolean
  /** one of a list that is not empty */
  readonly pick: <T>(list: readonly T[]) => T
  /** one key, as often as its weight says */
  readonly weighted: <K extends string>(weights: Readonly<Partial<Record<K, number>>>) => K
  /** the list in another order; the list itself is left alone */
  readonly shuffled: <T>(list: readonly T[]) => T[]
}

/**
 * Pseudo-random numbers from a seed.
 * @param seed any text; the same text gives the same numbers
 * @source generator: mulberry32, T. Ettinger, public domain; seed hash: FNV-1a, 32 bits (both from memory)
 * @example seededRandom('larrow').whole(1, 6) === seededRandom('larrow').whole(1, 6) // true
 */
export function seededRandom(seed: string): SeededRandom {
  let state = fnv1a(seed)
  const next = () => {
    state = (state + 0x6d2b79f5) | 0
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state)
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32
  }
  const between = (from: number, to: number) => from + next() * (to - from)
  const whole = (from: number, to: number) => Math.floor(between(from, to + 1))
  const pick = <T>(list: readonly T[]): T => {
    if (list.length === 0) throw new RangeError('There is nothing to pick from')
    return list[whole(0, list.length - 1)] as T
  }
  const weighted = <K extends string>(weights: Readonly<Partial<Record<K, number>>>): K => {
    const entries = Object.entries(weights) as [K, number][]
    let left = next() * entries.reduce((sum, [, weight]) => sum + weight, 0)
    for (const [key, weight] of entries) if ((left -= weight) < 0) return key
    return pick(entries)[0]
  }
  const shuffled = <T>(list: readonly T[]): T[] => {
    const copy = [...list]
    for (let at = copy.length - 1; at > 0; at -= 1) {
      const other = whole(0, at)
      ;[copy[at], copy[other]] = [copy[other] as T, copy[at] as T]
    }
    return copy
  }
  return { next, whole, between, chance: (share) => next() < share, pick, weighted, shuffled }
}

function fnv1a(text: string): number {
  let hash = 0x811c9dc5
  for (const character of text) hash = Math.imul(hash ^ (character.codePointAt(0) ?? 0), 0x01000193)
  return hash | 0
}
