/** Text in forms about homes: one line or a few, emptied of control characters, an empty one taken as none. See also lib/forms/one-line. */
import { z } from 'zod'

const oneLineOf = (text: string) => text.replace(/[\p{Cc}\p{Zl}\p{Zp}\s]+/gu, ' ').trim()
const linesOf = (text: string) => text.replace(/[^\P{Cc}\n]/gu, ' ').trim()

const upTo = (longest: number, fold: (text: string) => string) =>
  z
    .string()
    .transform(fold)
    .pipe(z.string().max(longest, `Use ${longest} characters or fewer.`))

/** A line that may be left empty, as null. @param longest [characters] */
export const optionalLine = (longest: number) =>
  z.preprocess((given) => given ?? '', upTo(longest, oneLineOf)).transform((text) => text || null)

/** A few lines that may be left empty, as null. @param longest [characters] */
export const optionalLines = (longest: number) =>
  z.preprocess((given) => given ?? '', upTo(longest, linesOf)).transform((text) => text || null)

/** A few lines that must be there. @param missing what to say where they are empty */
export const lines = (missing: string, longest: number) =>
  z
    .string({ error: missing })
    .transform(linesOf)
    .pipe(z.string().min(1, missing).max(longest, `Use ${longest} characters or fewer.`))
