import { createHash } from 'node:crypto'

/** A key for a set of headings, so that the next file with the same ones finds its mapping [hex, 64 characters]. */
export function headingsKey(headings: readonly string[]): string {
  const folded = headings.map((heading) => heading.trim().replace(/\s+/g, ' ').toLowerCase())
  return createHash('sha256').update(JSON.stringify(folded)).digest('hex')
}
