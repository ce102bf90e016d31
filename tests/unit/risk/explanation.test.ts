/** The explanation of a score, kept as text and told in words. No source. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { assess } from '@/lib/risk/assess'
import { explanationFromText, explanationToText } from '@/lib/risk/explanation-text'
import { likelihoodInWords, shiftInWords, stepsInWords } from '@/lib/risk/explanation-words'
import { FIRST_METHOD } from '@/lib/risk/first-method'
import { anyFacts, NOTHING_KNOWN, TODAY } from './risk-facts'

describe('as text', () => {
  it('comes back the same', () => {
    fc.assert(
      fc.property(anyFacts, (facts) => {
        const assessment = assess(facts, FIRST_METHOD, TODAY)
        expect(explanationFromText(explanationToText(assessment))).toEqual(assessment)
      }),
      { numRuns: 100 },
    )
  })

  it('refuses what is no explanation, is altered, or is of a form it does not know', () => {
    const text = explanationToText(assess(NOTHING_KNOWN, FIRST_METHOD, TODAY))
    expect(() => explanationFromText('')).toThrow(SyntaxError)
    expect(() => explanationFromText('{}')).toThrow()
    expect(() => explanationFromText(text.replace('"form":1', '"form":2'))).toThrow()
    expect(() => explanationFromText(text.replace(/"words":\[.*?\]/, '"words":[]'))).toThrow(RangeError)
  })
})

describe('in words', () => {
  it.each([
    [319.6, '1 in 320'],
    [19_869, '1 in 19,869'],
    [7.48, '1 in 7.5'],
    [9.97, '1 in 10'],
    [1, '1 in 1'],
  ])('a likelihood of 1 in %d', (oneIn, words) => {
    expect(likelihoodInWords(oneIn)).toBe(words)
  })

  it.each([
    [2.5, '2.5 steps likelier'],
    [1, '1 step likelier'],
    [-1, '1 step less likely'],
    [-0.26, '0.3 steps less likely'],
    [0.04, 'no change'],
    [0, 'no change'],
  ])('%d steps', (steps, words) => {
    expect(stepsInWords(steps)).toBe(words)
  })

  it('a shift, known or unknown', () => {
    expect(shiftInWords({ reason: 'No RCD', steps: 2.5, unknown: false })).toBe('No RCD: 2.5 steps likelier')
    expect(shiftInWords({ reason: 'Wiring not known', steps: 0.52, unknown: true })).toBe(
      'Wiring not known: 0.5 steps likelier, the mean over what it could be',
    )
  })
})
