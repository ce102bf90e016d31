/** Whether a number format shows a number as a date. */

/**
 * Built-in formats that show a day; 18 to 21 and 45 to 47 show a time of day alone.
 * @source ECMA-376 Part 1, 18.8.30 numFmt: the built-in identifiers, and those of the East Asian locales
 */
const BUILT_IN = new Set([14, 15, 16, 17, 22, 27, 28, 29, 30, 31, 36, 50, 51, 52, 53, 54, 55, 56, 57, 58])

/**
 * A number format that shows a day, a month or a year.
 * @param id the format's number; from 164 upwards it is the workbook's own
 * @param code the workbook's own format, where it has one
 * @example isDateFormat(14) // true
 * @example isDateFormat(164, 'dd/mm/yyyy;@') // true
 * @example isDateFormat(165, '[Red]#,##0 "days"') // false
 */
export function isDateFormat(id: number, code?: string): boolean {
  if (code === undefined) return BUILT_IN.has(id)
  const bare = (code.split(';')[0] ?? '')
    .replaceAll(/"[^"]*"/g, '')
    .replaceAll(/[\\_*]./g, '')
    .replaceAll(/\[[hms]+\]/gi, 'h') // elapsed time
    .replaceAll(/\[[^\]]*\]/g, '')
    .replaceAll(/am\/pm|a\/p/gi, '')
    .replaceAll(/general/gi, '')
  if (/[dy]/i.test(bare)) return true
  return /m/i.test(bare) && !/[hs]/i.test(bare)
}
