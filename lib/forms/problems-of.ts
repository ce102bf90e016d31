import { type z } from 'zod'
import { type FieldProblem } from '@/lib/errors/expected'

const OWN_WORDS = /^(Invalid input|Invalid option|Too small|Too big|Invalid string|Unrecognized key)/

/**
 * Every problem that a schema found, by field, the first of each field. A schema's own words are kept; the library's
 * default words are for programmers, so they are replaced.
 * @example problemsOf(z.object({ name: z.string() }).safeParse({}).error) // [{ field: 'name', problem: 'Fill this in.' }]
 */
export function problemsOf(error: Pick<z.ZodError, 'issues'>): FieldProblem[] {
  const problems = new Map<string, string>()
  for (const issue of error.issues) {
    const field = String(issue.path[0] ?? '')
    if (problems.has(field)) continue
    const missing = issue.code === 'invalid_type' && /received undefined/.test(issue.message)
    const plain = missing ? 'Fill this in.' : 'That is not one of the values this can take.'
    problems.set(field, OWN_WORDS.test(issue.message) ? plain : issue.message)
  }
  return [...problems].map(([field, problem]) => ({ field, problem }))
}
