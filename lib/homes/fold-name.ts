/**
 * Folds the name of a patch or block, so that it is the same whatever its case and spaces.
 * @example foldName('  North  quay ') // 'north quay'
 */
export const foldName = (name: string): string => name.trim().replace(/\s+/g, ' ').toLowerCase()
