import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { builtFromText, builtToText } from '@/lib/homes/built-text'
import { type YearBuilt, yearBuiltInWords } from '@/lib/homes/year-built'

const year = fc.option(fc.integer({ min: 1000, max: 2100 }))
const anyBuilt: fc.Arbitrary<YearBuilt> = fc
  .record({ from: year, to: year, about: fc.boolean() })
  .map(({ from, to, about }) =>
    from !== null && to !== null && from > to ? { from: to, to: from, about } : { from, to, about },
  )

describe('the stored text of a year built', () => {
  it.each([
    ['1931', 1931, 1931, false, '1931'],
    ['~1931', 1931, 1931, true, 'about 1931'],
    ['1960/1969', 1960, 1969, false, '1960 to 1969'],
    ['~1895/1905', 1895, 1905, true, 'about 1900'],
    ['../1939', null, 1939, false, 'before 1940'],
    ['1991/..', 1991, null, false, '1991 or later'],
    ['../..', null, null, false, 'not known'],
  ] as const)('%s is %s to %s, about: %s, in words %s', (text, from, to, about, words) => {
    expect(builtFromText(text)).toEqual({ from, to, about })
    expect(builtToText({ from, to, about })).toBe(text)
    expect(yearBuiltInWords({ from, to, about })).toBe(words)
  })

  it.each([
    '',
    '31',
    '19310',
    '1969/1960',
    '1960-1969',
    '0999',
    '2101',
    '1931/',
    '/1931',
    '..',
    '~',
    '1931~',
    ' 1931',
    '1931\n',
    '1960s',
  ])('is not %j', (text) => {
    expect(builtFromText(text)).toBeNull()
  })

  it('comes back as it went', () => {
    fc.assert(
      fc.property(anyBuilt, (built) => {
        expect(builtFromText(builtToText(built))).toEqual(built)
      }),
    )
  })

  it('has one text for one meaning', () => {
    expect(builtToText(builtFromText('1931/1931') as YearBuilt)).toBe('1931')
  })
})
