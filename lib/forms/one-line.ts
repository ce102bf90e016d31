import { z } from 'zod'

/**
 * One line of text, without blanks at its ends and control characters.
 * @param missing what to say where it is empty
 * @param longest [characters]
 */
export const oneLine = (missing: string, longest: number) =>
  z
    .string({ error: missing })
    .transform((text) => text.replace(/[\p{Cc}\p{Zl}\p{Zp}]+/gu, ' ').trim())
    .pipe(z.string().min(1, missing).max(longest, `Use ${longest} characters or fewer.`))
