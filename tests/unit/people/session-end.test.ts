import { expect, it } from 'vitest'
import { sessionEnd } from '@/lib/use-cases/people/session-life'

const at = (text: string) => new Date(text)

it('ends twelve hours after the last use', () =>
  expect(sessionEnd(at('2026-12-01T09:00:00Z'), at('2026-12-02T10:00:00Z'))).toEqual(
    at('2026-12-02T22:00:00Z'),
  ))

it('ends seven days after it began, however much it is used', () =>
  expect(sessionEnd(at('2026-12-01T09:00:00Z'), at('2026-12-08T08:59:00Z'))).toEqual(
    at('2026-12-08T09:00:00Z'),
  ))
