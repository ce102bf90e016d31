/**
 * The ways of a consumer unit, as short text that the register keeps and the board strip draws.
 * R rewireable, C cartridge, B breaker, O RCBO, X blank, U not known; [ ] encloses the ways behind one RCD.
 * "RRRR[BB]U" is four rewireable ways, two breakers behind an RCD and one way not known.
 */
export const WAY_LETTERS = {
  R: 'rewireable',
  C: 'cartridge',
  B: 'breaker',
  O: 'rcbo',
  X: 'blank',
  U: 'unknown',
} as const
export type WayDevice = (typeof WAY_LETTERS)[keyof typeof WAY_LETTERS]

/** `behindRcd` numbers the RCD [1 upwards] that protects the way; 0 where none does. */
export type Way = { readonly device: WayDevice; readonly behindRcd: number }

/** A consumer unit has at most this many ways; a longer text is a slip of the keyboard. */
export const MOST_WAYS = 40

/**
 * The ways that a text holds, or null where it is no such text.
 * @example waysOf('R[BO]') // [{rewireable, 0}, {breaker, 1}, {rcbo, 1}]
 */
export function waysOf(text: string): readonly Way[] | null {
  const ways: Way[] = []
  let behindRcd = 0
  let rcds = 0
  for (const letter of text) {
    if (letter === '[') {
      if (behindRcd > 0) return null
      behindRcd = rcds += 1
    } else if (letter === ']') {
      if (behindRcd === 0 || ways.at(-1)?.behindRcd !== behindRcd) return null
      behindRcd = 0
    } else if (letter in WAY_LETTERS) {
      ways.push({ device: WAY_LETTERS[letter as keyof typeof WAY_LETTERS], behindRcd })
    } else return null
  }
  return behindRcd === 0 && ways.length > 0 && ways.length <= MOST_WAYS ? ways : null
}
