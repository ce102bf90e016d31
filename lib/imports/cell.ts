/** A cell as a reader hands it over, before anybody has decided what it means. Types only. */

/** A number that the workbook shows as a date: days since 1899-12-30, or since 1904-01-01 where the workbook says so. */
export type DateSerial = { readonly serial: number; readonly epoch: 1900 | 1904 }

/** Text, a number, a truth value, a date serial, an error such as #REF!, or nothing. A formula is its stored result. */
export type Cell = string | number | boolean | DateSerial | { readonly error: string } | null

/** One row of a sheet: its number as the person sees it [1 upwards], and its cells from the first column. */
export type SheetRow = { readonly number: number; readonly cells: readonly Cell[] }

/** A sheet of a workbook; a CSV file is one sheet without a name. */
export type SheetName = { readonly name: string; readonly index: number }
