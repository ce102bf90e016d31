import { type Delimiter } from './sheet-file'

const CANDIDATES: readonly Delimiter[] = [',', ';', '\t', '|']
/** Enough lines to pass over a title and see how the cells are parted. */
const LINES = 40

/** How often each candidate stands outside quotation marks, line by line. */
function countsByLine(text: string): Map<Delimiter, number[]> {
  const lines = new Map(CANDIDATES.map((candidate) => [candidate, [0]]))
  let quoted = false
  let line = 0
  for (const letter of text) {
    if (letter === '"') quoted = !quoted
    else if (letter === '\n' && !quoted) {
      if (++line >= LINES) break
      for (const counts of lines.values()) counts.push(0)
    } else if (!quoted) {
      const counts = lines.get(letter as Delimiter)
      if (counts) counts[line] = (counts[line] ?? 0) + 1
    }
  }
  return lines
}

/**
 * What parts the cells: the candidate that stands equally often in the most lines, a comma where none does.
 * A first line `sep=;`, which some programs write, settles it.
 * @param start the first part of the file, decoded
 * @example guessDelimiter('Address;Built\n"4, Lantern Lane";1958\n') // ';'
 */
export function guessDelimiter(start: string): Delimiter {
  const told = /^\uFEFF?sep=([,;\t|])\r?\n/i.exec(start)
  if (told) return told[1] as Delimiter
  let best: Delimiter = ','
  let bestScore = 0
  for (const [candidate, counts] of countsByLine(start.replaceAll(/\r\n?/g, '\n'))) {
    const tally = new Map<number, number>()
    for (const count of counts) if (count > 0) tally.set(count, (tally.get(count) ?? 0) + 1)
    for (const [count, lines] of tally) {
      const score = lines * (1 + Math.log2(count))
      if (score > bestScore) [best, bestScore] = [candidate, score]
    }
  }
  return best
}
