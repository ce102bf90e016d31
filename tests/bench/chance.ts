/** Chance that repeats: the same seed gives the same numbers. Mulberry32, a public-domain generator; enough for made-up homes. */
export function chance(seed: number) {
  let state = seed >>> 0
  const fraction = (): number => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296
  }
  const below = (n: number): number => Math.floor(fraction() * n)
  const one = <T>(list: readonly T[]): T => list[below(list.length)] as T
  return { fraction, below, one }
}
