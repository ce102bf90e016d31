const LONGEST = 48

/**
 * An organisation's name as it stands in a command or an address: lower-case letters, digits and hyphens.
 * @returns at least one character, at most 48
 * @example slugOf('Pat & Jo’s Lettings') // 'pat-jos-lettings'
 */
export function slugOf(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/[\u0300-\u036f'’]/g, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, LONGEST)
    .replace(/^-+|-+$/g, '')
  return plain || 'organisation'
}
