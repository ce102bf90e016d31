/**
 * The four kinds of refusal that a use-case may throw. Everything else that is thrown is a fault.
 * A refusal's message is written for the person who reads it; a fault's message is written for the log.
 */

/** One thing wrong with one field, in the words of the person's problem. */
export type FieldProblem = { field: string; problem: string }

export abstract class Refusal extends Error {
  abstract readonly kind: 'not-found' | 'not-allowed' | 'invalid' | 'conflict'
  constructor(message: string) {
    super(message)
    this.name = new.target.name
  }
}

/** The thing is not there, or belongs to another organisation or patch: the two are never told apart. */
export class NotFound extends Refusal {
  readonly kind = 'not-found'
  constructor(what = 'That page or record') {
    super(`${what} was not found.`)
  }
}

/** The person is known, the thing may be seen, and the act is not theirs to do. */
export class NotAllowed extends Refusal {
  readonly kind = 'not-allowed'
  constructor(message = 'Your role does not allow that.') {
    super(message)
  }
}

/** The input is wrong: each problem names its field. */
export class Invalid extends Refusal {
  readonly kind = 'invalid'
  constructor(readonly problems: readonly FieldProblem[]) {
    super(problems.map((one) => one.problem).join(' '))
  }
}

/** Somebody else got there first, or the thing has moved on. */
export class Conflict extends Refusal {
  readonly kind = 'conflict'
}

/** Whether a thrown value is one of the four expected refusals. */
export const isRefusal = (thrown: unknown): thrown is Refusal => thrown instanceof Refusal
