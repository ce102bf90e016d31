import { type Cell } from './cell'

/** A list uses some dozens of words for its boards; more than this many different ones are not worth keeping. */
const MOST = 5000

/**
 * A reader that keeps what it made of each text: the same few words stand in a hundred thousand rows. The readers are
 * pure, so that what is kept is always right.
 * @example const read = remembered(readBoardType)
 */
export function remembered<T>(read: (cell: Cell) => T): (cell: Cell) => T {
  const kept = new Map<string, T>()
  return (cell) => {
    if (typeof cell !== 'string') return read(cell)
    const before = kept.get(cell)
    if (before !== undefined) return before
    const reading = read(cell)
    if (kept.size < MOST) kept.set(cell, reading)
    return reading
  }
}
