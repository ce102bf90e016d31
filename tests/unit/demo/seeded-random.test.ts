import { describe, expect, it } from 'vitest'
import { seededRandom } from '@/db/seeds/seeded-random'

const first = (seed: string, count: number) => {
  const random = seededRandom(seed)
  return Array.from({ length: count }, random.next)
}

describe('seededRandom', () => {
  it('gives the same numbers for the same seed, and others for another', () => {
    expect(first('larrow', 50)).toEqual(first('larrow', 50))
    expect(first('larrow', 50)).not.toEqual(first('llinos', 50))
  })

  it('spreads evenly: each tenth holds about a tenth of 20,000', () => {
    const tenths = Array.from({ length: 10 }, () => 0)
    for (const value of first('spread', 20_000)) {
      expect(value >= 0 && value < 1).toBe(true)
      tenths[Math.floor(value * 10)] = (tenths[Math.floor(value * 10)] ?? 0) + 1
    }
    // standard deviation of a binomial count: sqrt(20000 * 0.1 * 0.9), about 42; five of them either side
    for (const count of tenths) expect(Math.abs(count - 2_000)).toBeLessThan(212)
  })

  it('picks keys as often as their weight says, and keeps every item when it shuffles', () => {
    const random = seededRandom('weights')
    const drawn = Array.from({ length: 10_000 }, () => random.weighted({ rare: 1, often: 9 }))
    expect(drawn.filter((key) => key === 'rare').length).toBeGreaterThan(850)
    expect(drawn.filter((key) => key === 'rare').length).toBeLessThan(1_150)
    const list = [1, 2, 3, 4, 5, 6, 7, 8, 9]
    const shuffled = random.shuffled(list)
    expect(shuffled.toSorted()).toEqual(list)
    expect(shuffled).not.toEqual(list)
  })

  it('has nothing to pick from an empty list', () => {
    expect(() => seededRandom('empty').pick([])).toThrow(RangeError)
  })
})
