import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { boardInWords } from '@/lib/electrical/board-in-words'
import { boardTypeOfWays } from '@/lib/electrical/board-type-of-ways'
import { MOST_WAYS, type Way, WAY_LETTERS, waysOf } from '@/lib/electrical/consumer-unit'
import { rcdCoverOfWays } from '@/lib/electrical/rcd-cover-of-ways'
import { waysInWords } from '@/lib/electrical/ways-in-words'

const read = (text: string): readonly Way[] => {
  const ways = waysOf(text)
  if (!ways) throw new Error(`no ways in ${text}`)
  return ways
}
const letters = fc.constantFrom(...Object.keys(WAY_LETTERS))

describe('the ways that a code holds', () => {
  it('numbers the RCDs from the left', () => {
    expect(read('R[BO]X[B]').map(({ device, behindRcd }) => `${device} ${behindRcd}`)).toEqual([
      'rewireable 0',
      'breaker 1',
      'rcbo 1',
      'blank 0',
      'breaker 2',
    ])
  })

  it.each(['', '[]', 'R[', 'R]', '[[B]]', 'B[]', 'r', 'R B', '5R', 'R'.repeat(MOST_WAYS + 1), '[B][]'])(
    'is no code: %j',
    (text) => {
      expect(waysOf(text)).toBeNull()
    },
  )

  it('answers any text without a fault', () => {
    fc.assert(fc.property(fc.string({ unit: 'binary' }), (text) => waysOf(text) === null || text.length > 0))
  })
})

describe('a board in words', () => {
  it.each([
    ['RRRRRU', 'rewireable', 'none', '6 ways: 5 rewireable, 1 not known; no RCD'],
    ['RRRRRB', 'mixed', 'none', '6 ways: 5 rewireable, 1 breaker; no RCD'],
    ['B', 'breakers', 'unknown', '1 way: 1 breaker; RCD cover not known'],
    [
      'C[BB]OX',
      'cartridge',
      'part',
      '5 ways: 1 cartridge fuse, 2 breakers, 1 RCBO, 1 blank; RCD on some circuits',
    ],
    ['OOOO', 'rcbo', 'all', '4 ways: 4 RCBOs; RCD on all circuits'],
    [null, 'rewireable', 'none', 'Rewireable fuses, number of ways not known; no RCD'],
    [null, 'breakers', 'sockets', 'Circuit breakers, number of ways not known; RCD on the sockets only'],
    [null, 'unknown', 'unknown', 'Consumer unit not known; RCD cover not known'],
    ['what?', 'rewireable', 'none', 'Rewireable fuses, number of ways not known; no RCD'],
  ] as const)('%s, %s, %s: %s', (ways, boardType, rcdCover, words) => {
    expect(boardInWords({ ways, boardType, rcdCover })).toBe(words)
  })

  it('accounts for every way', () => {
    fc.assert(
      fc.property(fc.array(letters, { minLength: 1, maxLength: MOST_WAYS }), (code) => {
        const [total, ...parts] = (waysInWords(read(code.join(''))).match(/\d+/g) ?? []).map(Number)
        expect(total).toBe(code.length)
        expect(parts.reduce((sum, n) => sum + n, 0)).toBe(code.length)
      }),
    )
  })
})

describe('what the ways show', () => {
  it.each([
    ['RRRR', 'rewireable', 'unknown'],
    ['RRRU', 'rewireable', 'unknown'],
    ['RRBB', 'mixed', 'unknown'],
    ['RC', 'mixed', 'unknown'],
    ['RRXX', 'rewireable', 'unknown'],
    ['CCCC', 'cartridge', 'unknown'],
    ['CB', 'cartridge', 'unknown'],
    ['[BBBB]', 'breakers', 'all'],
    ['[BB]OO', 'breakers', 'all'],
    ['[BB][BB]X', 'breakers', 'all'],
    ['BB[BB]', 'breakers', 'part'],
    ['BBO', 'breakers', 'part'],
    ['BBU', 'unknown', 'unknown'],
    ['OOU', 'unknown', 'part'],
    ['OOO', 'rcbo', 'all'],
    ['XX', 'unknown', 'unknown'],
    ['UUU', 'unknown', 'unknown'],
    ['[RRRR]', 'rewireable', 'all'],
  ] as const)('%s: %s, %s', (code, boardType, rcdCover) => {
    expect(boardTypeOfWays(read(code))).toBe(boardType)
    expect(rcdCoverOfWays(read(code))).toBe(rcdCover)
  })

  it('has rewireable ways exactly where the code has one, or may have where a way is not known', () => {
    fc.assert(
      fc.property(fc.array(letters, { minLength: 1, maxLength: MOST_WAYS }), (code) => {
        const type = boardTypeOfWays(read(code.join('')))
        expect(type === 'rewireable' || type === 'mixed').toBe(code.includes('R'))
        if (code.includes('U') && !code.includes('R')) expect(type).toBe('unknown')
      }),
    )
  })
})
