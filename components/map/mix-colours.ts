/**
 * A colour between two, in sRGB: what the canvas of the map needs, which knows no `color-mix()` of tokens.
 * @param share of the first [0 to 1]
 * @throws RangeError where a colour is not of the form #RRGGBB or, as a build shortens it, #RGB
 * @example mixColours('#000000', '#FFFFFF', 0.5) // '#808080'
 */
export function mixColours(first: string, second: string, share: number): string {
  const [a, b] = [channels(first), channels(second)]
  return `#${a.map((value, at) => hex(value * share + (b[at] as number) * (1 - share))).join('')}`
}

const hex = (value: number) => Math.round(value).toString(16).padStart(2, '0')

function channels(colour: string): number[] {
  const digits = /^#([\da-f]{6}|[\da-f]{3})$/i.exec(colour.trim())?.[1]
  if (!digits) throw new RangeError(`Not a colour: ${colour}`)
  const pairs = digits.length === 3 ? [...digits].map((digit) => digit + digit) : (digits.match(/../g) ?? [])
  return pairs.map((pair) => Number.parseInt(pair, 16))
}
