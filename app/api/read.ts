/** Route handlers that read: actor, parse, call, and refusals as statuses. A handler is one line above this. */
import 'server-only'
import { unstable_rethrow } from 'next/navigation'
import { type z } from 'zod'
import { type Actor } from '@/lib/access/actor'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { Invalid, isRefusal, type Refusal } from '@/lib/errors/expected'
import { fieldsOf } from '@/lib/forms/fields-of'
import { problemsOf } from '@/lib/forms/problems-of'
import { today } from '@/lib/platform/clock'
import { logFault } from '@/lib/platform/log-fault'
import { optionalActor } from '@/app/session'

type Context = { params: Promise<Record<string, string | string[]>> }

const STATUS: Record<Refusal['kind'], number> = {
  'not-found': 404,
  'not-allowed': 403,
  invalid: 400,
  conflict: 409,
}
const PRIVATE = 'private, no-store'

/** An answer that no cache may keep. */
export const answer = (body: unknown, status = 200): Response =>
  Response.json(body, { status, headers: { 'Cache-Control': PRIVATE } })

/** The one place where a refusal becomes a status, and a fault an id. */
export function answerRefusal(thrown: unknown): Response {
  unstable_rethrow(thrown)
  if (thrown instanceof Invalid) return answer({ error: 'invalid', problems: thrown.problems }, 400)
  if (isRefusal(thrown)) return answer({ error: thrown.kind, message: thrown.message }, STATUS[thrown.kind])
  return answer({ error: 'fault', fault: logFault(thrown, 'api') }, 500)
}

/** What somebody gets who is not signed in, or no longer. */
export const answerSignedOut = (): Response =>
  answer({ error: 'signed-out', message: 'You are not signed in, or no longer.' }, 401)

/**
 * A GET handler: query and path parameters by the schema, then the use-case. A use-case may give a Response of its
 * own (a file); anything else is sent as JSON.
 * @example export const GET = reads(HomeQuery, listHomes)
 */
export function reads<Schema extends z.ZodType, Result>(
  schema: Schema,
  useCase: (actor: Actor, input: z.output<Schema>, today: CalendarDay) => Promise<Result>,
) {
  return async (request: Request, context?: Context): Promise<Response> => {
    try {
      const actor = await optionalActor()
      if (!actor) return answerSignedOut()
      const query = fieldsOf(new URL(request.url).searchParams.entries())
      const parsed = schema.safeParse({ ...query, ...(await context?.params) })
      if (!parsed.success) throw new Invalid(problemsOf(parsed.error))
      const result = await useCase(actor, parsed.data, today())
      if (!(result instanceof Response)) return answer(result ?? null)
      result.headers.set('Cache-Control', PRIVATE)
      return result
    } catch (thrown) {
      return answerRefusal(thrown)
    }
  }
}
