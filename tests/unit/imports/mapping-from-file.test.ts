import { describe, expect, it } from 'vitest'
import { Invalid } from '@/lib/errors/expected'
import { columnLetter, columnOfLetter } from '@/lib/imports/column-letter'
import { mappingFromFile, mappingToFile } from '@/lib/imports/mapping-from-file'

const headings = ['Prop Ref', 'P’code', 'Last test', 'Last test', 'Q', null]

function problemsOf(json: unknown): readonly string[] {
  try {
    mappingFromFile(json, headings)
  } catch (thrown) {
    if (thrown instanceof Invalid) return thrown.problems.map((one) => one.problem)
    throw thrown
  }
  return []
}

describe('a mapping kept as a file', () => {
  it('names columns by heading, in any letters, or by letter', () => {
    expect(
      mappingFromFile({ reference: 'PROP REF', postcode: "P'code", note: 'F', tenure: null }, headings),
    ).toEqual({
      reference: 0,
      postcode: 1,
      note: 5,
    })
  })

  it('a heading counts before a letter', () => {
    expect(mappingFromFile({ note: 'Q' }, headings)).toEqual({ note: 4 })
  })

  it.each([
    [{ colour: 'A' }, /^colour: there is no such field; the fields are reference, uprn/],
    [{ note: 'Remarks' }, /^note: there is no heading "Remarks"\.$/],
    [{ note: 'Z' }, /^note: there is no column Z\.$/],
    [{ 'last-inspection': 'Last test' }, /stands over columns C and D: give the letter/],
    [{ note: 'A', reference: 'Prop Ref' }, /column A is taken by note already/],
    [{ note: 4 }, /give a heading or the letter/],
    ['note', /JSON object/],
    [[], /JSON object/],
  ])('%j is refused', (json, problem) => {
    expect(problemsOf(json)).toEqual([expect.stringMatching(problem)])
  })

  it('comes back the same from the file it is kept in', () => {
    const mapping = { reference: 0, postcode: 1, 'last-inspection': 2, 'next-due': 3, note: 5 }
    const file = mappingToFile(mapping, headings)
    expect(file).toEqual({
      reference: 'Prop Ref',
      postcode: 'P’code',
      'last-inspection': 'C',
      'next-due': 'D',
      note: 'F',
    })
    expect(mappingFromFile(file, headings)).toEqual(mapping)
  })
})

it.each([[0, 'A'], [25, 'Z'], [26, 'AA'], [27, 'AB'], [701, 'ZZ'], [702, 'AAA']])('column %d is %s', (column, letters) => {
  expect(columnLetter(column)).toBe(letters)
  expect(columnOfLetter(letters)).toBe(column)
}) // prettier-ignore
