/** A spreadsheet file, opened: what kind it is, which sheets it shows, and their rows as a stream. Types only. */
import { type SheetName, type SheetRow } from '@/lib/imports/cell'

export type TextEncoding = 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252'
export type Delimiter = ',' | ';' | '\t' | '|'

export type SheetFile = {
  readonly kind: 'xlsx' | 'text'
  /** how a text file spells its letters; absent for a workbook */
  readonly encoding?: TextEncoding
  /** what parts the cells of a text file; absent for a workbook */
  readonly delimiter?: Delimiter
  /** the sheets that a person sees, in their order; a text file is one sheet without a name */
  readonly sheets: readonly SheetName[]
  /** the first rows of a sheet [1 upwards], to choose the header row and guess the columns from */
  preview(index: number, rows: number): Promise<SheetRow[]>
  /** every row of a sheet, read as it is asked for */
  rows(index: number): AsyncIterable<SheetRow>
  /** what was read in spite of a fault, in words: known once the rows have been read */
  remarks(): readonly string[]
  close(): Promise<void>
}

/** No stock list has more columns than this. */
export const MOST_COLUMNS = 500
