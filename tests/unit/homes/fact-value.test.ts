import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { Invalid } from '@/lib/errors/expected'
import { BOARD_TYPES } from '@/lib/homes/board-type'
import { FACT_KINDS, type FactKind } from '@/lib/homes/fact'
import { factValueInWords, readFactValue } from '@/lib/homes/fact-value'

const problemOf = (kind: FactKind, value: string) => {
  try {
    readFactValue(kind, value)
  } catch (thrown) {
    if (thrown instanceof Invalid) return thrown.problems
    throw thrown
  }
  return []
}

describe('reading a fact’s value', () => {
  it.each([
    ['board-type', 'rewireable', 'rewireable', 'rewireable', 'Rewireable fuses'],
    ['rcd-cover', 'sockets', 'sockets', 'sockets', 'Sockets only'],
    ['ways', 'RRR[BB]', 'RRR[BB]', 'RRR[BB]', '5 ways: 3 rewireable, 2 breakers'],
    ['wiring', 'lead', 'lead', 'lead', 'Lead sheathed'],
    ['rewired', '1998', 1998, '1998', '1998'],
    ['built', '~1895/1905', { from: 1895, to: 1905, about: true }, '~1895/1905', 'about 1900'],
    ['built', '1931/1931', { from: 1931, to: 1931, about: false }, '1931', '1931'],
    ['dwelling-type', 'end-terrace', 'end-terrace', 'end-terrace', 'End terrace'],
    ['bedrooms', ' 03 ', 3, '3', '3'],
    ['bedrooms', '0', 0, '0', '0'],
    ['inspection-record', 'never', 'never', 'never', 'Never inspected'],
    ['inspection-record', 'reported', 'reported', 'reported', 'Inspected, date not known'],
  ] as const)('%s %j is %j, kept as %j, in words %j', (kind, value, meaning, text, words) => {
    expect(readFactValue(kind, value)).toEqual({ kind, value: meaning, text })
    expect(factValueInWords(kind, value)).toBe(words)
  })

  it.each(FACT_KINDS)('%s can be known not to be known', (kind) => {
    expect(readFactValue(kind, null).text).toBeNull()
    expect(readFactValue(kind, '  ').text).toBeNull()
    expect(factValueInWords(kind, null)).toBe('not known')
  })

  it('takes the word for "not known" as nothing known', () => {
    expect(readFactValue('wiring', 'unknown')).toEqual({ kind: 'wiring', value: 'unknown', text: null })
    expect(readFactValue('built', '../..').text).toBeNull()
    expect(factValueInWords('board-type', 'unknown')).toBe('not known')
  })

  it.each([
    ['board-type', 'Rewireable'],
    ['board-type', 'toString'],
    ['rcd-cover', 'some'],
    ['ways', '6'],
    ['ways', '[B]'.repeat(21)],
    ['wiring', 'string'],
    ['rewired', '98'],
    ['rewired', '1799'],
    ['rewired', '1998.5'],
    ['built', '1960s'],
    ['built', '1969/1960'],
    ['dwelling-type', 'castle'],
    ['bedrooms', '-1'],
    ['bedrooms', '51'],
    ['bedrooms', '1e1'],
    ['inspection-record', 'dated'],
  ] as const)('%s refuses %j with one problem at its field', (kind, value) => {
    const problems = problemOf(kind, value)
    expect(problems.map((one) => one.field)).toEqual([kind])
    // what is stored already is still shown, as it stands
    expect(factValueInWords(kind, value)).toBe(value)
  })

  it('says in plain words what is wanted', () => {
    expect(problemOf('bedrooms', 'three')[0]?.problem).toBe(
      'Bedrooms: Write a whole number of bedrooms from 0 to 50. Example: 3',
    )
    expect(problemOf('rcd-cover', 'some')[0]?.problem).toBe(
      'RCD cover: Choose one of these: No RCD; Sockets only; Part; All circuits; Not known.',
    )
  })

  it('answers any text with a value or a refusal, and keeps a text that reads the same', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...FACT_KINDS),
        fc.oneof(
          fc.string({ unit: 'binary' }),
          fc.stringMatching(/^[~./0-9RCBOXU[\]]{0,12}$/),
          fc.constantFrom(...BOARD_TYPES),
        ),
        (kind, value) => {
          const words = factValueInWords(kind, value)
          expect(typeof words).toBe('string')
          if (problemOf(kind, value).length > 0) return
          const first = readFactValue(kind, value)
          expect(readFactValue(kind, first.text)).toEqual(
            first.text === null ? readFactValue(kind, null) : first,
          )
        },
      ),
    )
  })
})
