/** The months in English, January first. Written out, so that no machine's locale can change a report. */
export const MONTH_NAMES = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const

/** The name of a month [1 to 12], whole or in its first three letters. */
export function monthName(month: number, style: 'long' | 'short'): string {
  const name = MONTH_NAMES[month - 1]
  if (!name) throw new RangeError(`There is no month ${month}`)
  return style === 'long' ? name : name.slice(0, 3)
}
