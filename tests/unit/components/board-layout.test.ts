import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { FIRST_WAY, layOutBoard } from '@/components/drawings/board-layout'
import { CELL_GAP, CELL_WIDTH, MODULE_WIDTH } from '@/components/drawings/board-paths'
import { type Way, waysOf } from '@/lib/electrical/consumer-unit'

const board = (text: string) => layOutBoard(waysOf(text) as readonly Way[])

describe('a board', () => {
  it('sets its ways one after another behind the main switch', () => {
    const { ways, rcds, brackets, width } = board('RRX')
    expect(ways.map(({ device, number }) => [device, number])).toEqual([
      ['rewireable', 1],
      ['rewireable', 2],
      ['blank', 3],
    ])
    expect(ways.map(({ x }) => x - FIRST_WAY)).toEqual([
      0,
      CELL_WIDTH + CELL_GAP,
      2 * (CELL_WIDTH + CELL_GAP),
    ])
    expect(width).toBe(FIRST_WAY + 3 * CELL_WIDTH + 2 * CELL_GAP)
    expect([rcds, brackets]).toEqual([[], []])
  })

  it('sets an RCD before the ways it protects, and brackets it with them alone', () => {
    const { ways, rcds, brackets } = board('R[BB]B')
    const [first, , last, beyond] = ways
    expect(rcds).toEqual([(first?.x ?? 0) + CELL_WIDTH + CELL_GAP])
    expect(brackets).toHaveLength(1)
    expect(brackets[0]?.[0]).toBeLessThan(ways[1]?.x ?? 0)
    expect(brackets[0]?.[1]).toBeGreaterThan(last?.x ?? 0)
    expect(brackets[0]?.[1]).toBeLessThan(beyond?.x ?? 0)
  })

  it('keeps two RCDs that stand side by side apart', () => {
    const { rcds, brackets } = board('[BB][BO]')
    expect(rcds).toHaveLength(2)
    expect(brackets[0]?.[1]).toBeLessThan(brackets[1]?.[0] ?? 0)
  })

  it('never lets two parts overlap, whatever the board', () => {
    const group = fc.tuple(
      fc.boolean(),
      fc.array(fc.constantFrom('R', 'C', 'B', 'O', 'X', 'U'), { minLength: 1, maxLength: 5 }),
    )
    fc.assert(
      fc.property(fc.array(group, { minLength: 1, maxLength: 6 }), (groups) => {
        const text = groups.map(([behind, ways]) => (behind ? `[${ways.join('')}]` : ways.join(''))).join('')
        const { ways, rcds, width } = board(text)
        const parts = [
          { from: 0, to: MODULE_WIDTH },
          ...rcds.map((x) => ({ from: x, to: x + MODULE_WIDTH })),
          ...ways.map(({ x }) => ({ from: x, to: x + CELL_WIDTH })),
        ].sort((a, b) => a.from - b.from)
        for (const [at, part] of parts.entries())
          expect(part.from).toBeGreaterThanOrEqual(parts[at - 1]?.to ?? 0)
        expect(parts.at(-1)?.to).toBe(width)
      }),
    )
  })
})
