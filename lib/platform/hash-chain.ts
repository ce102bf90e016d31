/** The hash that ties an audit entry to the one before it. */
import { createHash } from 'node:crypto'

/** What stands before the first entry of an organisation [hex, 64 zeros]. */
export const CHAIN_START = '0'.repeat(64)

export type ChainedEntry = {
  readonly organisationId: string
  readonly sequence: number
  /** ISO 8601 with milliseconds, UTC */
  readonly at: string
  readonly actorId: string | null
  readonly did: string
  readonly subjectKind: string
  readonly subjectId: string
  /** canonical JSON */
  readonly detail: string
}

/**
 * JSON with its keys in order, so that equal values give equal text.
 * @example canonicalJson({ b: 1, a: [2] }) // '{"a":[2],"b":1}'
 */
export function canonicalJson(value: unknown): string {
  return JSON.stringify(value, (_key, part: unknown) =>
    part !== null && typeof part === 'object' && !Array.isArray(part)
      ? Object.fromEntries(Object.entries(part).sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0)))
      : part,
  )
}

/** SHA-256 over the previous hash and every field of the entry, in a fixed order [hex]. */
export function chainHash(previous: string, entry: ChainedEntry): string {
  const { organisationId, sequence, at, actorId, did, subjectKind, subjectId, detail } = entry
  const text = JSON.stringify([
    previous,
    organisationId,
    sequence,
    at,
    actorId,
    did,
    subjectKind,
    subjectId,
    detail,
  ])
  return createHash('sha256').update(text).digest('hex')
}
