/** What a field reader makes of a cell: a value, perhaps with something worth knowing, or why it cannot be taken. */

export type Reading<T> =
  | { readonly ok: true; readonly value: T; readonly note: string | null }
  | { readonly ok: false; readonly why: string }

/**
 * A value that was read.
 * @param note short and in the person's words: "date known to the year"
 */
export const found = <T>(value: T, note: string | null = null): Reading<T> => ({ ok: true, value, note })

/** A cell that cannot be taken. The row is then rejected whole, so that nothing of it is half believed. */
export const wrong = (why: string): { readonly ok: false; readonly why: string } => ({ ok: false, why })
