/**
 * The letters that a spreadsheet shows above a column.
 * @param column [0 upwards]
 * @example columnLetter(27) // 'AB'
 */
export function columnLetter(column: number): string {
  const before = Math.floor(column / 26)
  const letter = String.fromCharCode(65 + (column % 26))
  return before === 0 ? letter : columnLetter(before - 1) + letter
}

/**
 * The column [0 upwards] of its letters, or null where they are none.
 * @example columnOfLetter('AB') // 27
 */
export function columnOfLetter(letters: string): number | null {
  if (!/^[A-Z]{1,3}$/.test(letters)) return null
  return [...letters].reduce((column, letter) => column * 26 + letter.charCodeAt(0) - 64, 0) - 1
}
