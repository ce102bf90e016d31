/** What protects the circuits of a home, as far as one word can say it. */
export const BOARD_TYPES = ['rewireable', 'cartridge', 'breakers', 'rcbo', 'mixed', 'unknown'] as const
export type BoardType = (typeof BOARD_TYPES)[number]

export const BOARD_TYPE_NAMES: Record<BoardType, string> = {
  rewireable: 'Rewireable fuses',
  cartridge: 'Cartridge fuses',
  breakers: 'Circuit breakers',
  rcbo: 'RCBOs',
  mixed: 'Mixed, some rewireable',
  unknown: 'Not known',
}

/** The answer to "which homes still have rewireable fuses": a mixed board has some. */
export const hasRewireableWays = (board: BoardType): boolean => board === 'rewireable' || board === 'mixed'
