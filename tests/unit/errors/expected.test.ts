import { describe, expect, it } from 'vitest'
import { Conflict, Invalid, isRefusal, NotAllowed, NotFound, Refusal } from '@/lib/errors/expected'

const all = [
  new NotFound('That home'),
  new NotAllowed(),
  new Invalid([{ field: 'built', problem: 'Write a year.' }]),
  new Conflict('Somebody else has changed this home.'),
]

describe('refusals', () => {
  it('are four kinds, each with its name', () => {
    expect(all.map((one) => [one.kind, one.name])).toEqual([
      ['not-found', 'NotFound'],
      ['not-allowed', 'NotAllowed'],
      ['invalid', 'Invalid'],
      ['conflict', 'Conflict'],
    ])
  })

  it('are errors with a stack, and told from faults', () => {
    for (const one of all) {
      expect(one).toBeInstanceOf(Refusal)
      expect(one).toBeInstanceOf(Error)
      expect(one.stack).toContain(one.name)
      expect(isRefusal(one)).toBe(true)
    }
    for (const fault of [
      new Error('no'),
      new TypeError('no'),
      { kind: 'not-found' },
      'not-found',
      null,
      undefined,
    ]) {
      expect(isRefusal(fault)).toBe(false)
    }
  })

  it('speak to the person who reads them', () => {
    expect(all.map((one) => one.message)).toEqual([
      'That home was not found.',
      'Your role does not allow that.',
      'Write a year.',
      'Somebody else has changed this home.',
    ])
    expect(new NotFound().message).toBe('That page or record was not found.')
  })

  it('keep every problem with its field', () => {
    const problems = [
      { field: 'built', problem: 'Write a year.' },
      { field: 'bedrooms', problem: 'Write a number.' },
    ]
    const invalid = new Invalid(problems)
    expect(invalid.problems).toEqual(problems)
    expect(invalid.message).toBe('Write a year. Write a number.')
  })
})
