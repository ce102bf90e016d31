import { type Reading } from '@/lib/imports/reading'

/** A reading as a table of cases shows it: the value, or the problem after an exclamation mark. */
export const readingOf = <T>(reading: Reading<T>): T | string =>
  reading.ok ? reading.value : `! ${reading.why}`
