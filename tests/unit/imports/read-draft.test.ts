import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { type Cell } from '@/lib/imports/cell'
import { createRowReader } from '@/lib/imports/create-row-reader'
import { guessMapping } from '@/lib/imports/guess-mapping'
import { type HomeDraft, IMPORT_FIELDS, type Mapping } from '@/lib/imports/home-draft'
import { type RowOutcome } from '@/lib/imports/row-outcome'

const today = calendarDay('2026-12-01')
const everyField: Mapping = Object.fromEntries(IMPORT_FIELDS.map((field, column) => [field, column]))

/** A row with the given fields, read through a mapping that knows every field. */
function readRow(fields: Partial<Record<(typeof IMPORT_FIELDS)[number], Cell>>): RowOutcome {
  const reader = createRowReader({ mapping: everyField, headings: [], today, nation: 'england' })
  return reader.read({ number: 7, cells: IMPORT_FIELDS.map((field) => fields[field] ?? null) })
}

function draftOf(outcome: RowOutcome): HomeDraft {
  if (outcome.kind !== 'accepted') throw new Error(`Not accepted: ${JSON.stringify(outcome)}`)
  return outcome.draft
}

const address = { number: '4', street: 'Lantern Lane', postcode: 'zx23qt' }

describe('a row read into a draft', () => {
  it('keeps what the row says, and not known where it says nothing', () => {
    const draft = draftOf(
      readRow({ ...address, town: 'Quillhaven', 'board-type': 'BS3036', 'last-inspection': 'Aug 2021' }),
    )
    expect(draft).toMatchObject({
      row: 7,
      address: '4 Lantern Lane',
      town: 'Quillhaven',
      postcode: 'ZX2 3QT',
      boardType: 'rewireable',
      rcdCover: 'unknown',
      tenure: 'unknown',
      nation: null,
      inspectionRecord: 'dated',
      lastInspection: { day: '2021-08-01', precision: 'month' },
      open: { C1: null, C2: null, C3: null, FI: null },
      latitude: null,
    })
  })

  it('keeps a formula in a note as plain text, and drops the apostrophe of an export', () => {
    expect(draftOf(readRow({ ...address, note: '=HYPERLINK("http://example.invalid","click")' })).note).toBe(
      '=HYPERLINK("http://example.invalid","click")',
    )
    expect(draftOf(readRow({ ...address, note: "'=1+1" })).note).toBe('=1+1')
    expect(draftOf(readRow({ ...address, note: "'tis cold" })).note).toBe("'tis cold")
  })

  it('cuts a note that is too long, and says so', () => {
    const outcome = readRow({ ...address, note: 'x'.repeat(600) })
    expect(draftOf(outcome).note).toHaveLength(500)
    expect(outcome).toMatchObject({
      problems: [{ field: 'note', severity: 'noted', why: 'note cut to 500 characters' }],
    })
  })

  it('takes RCD cover from the board only where the list has no column for it', () => {
    const { 'rcd-cover': _, ...without } = everyField
    const cells = IMPORT_FIELDS.map(
      (field) => ({ ...address, 'board-type': 'breakers with one RCD' })[field as 'street'] ?? null,
    )
    const reader = createRowReader({ mapping: without, headings: [], today, nation: 'england' })
    expect(draftOf(reader.read({ number: 1, cells })).rcdCover).toBe('part')
    expect(draftOf(readRow({ ...address, 'board-type': 'breakers with one RCD' })).rcdCover).toBe('unknown')
  })

  it('tells every problem of a row', () => {
    const outcome = readRow({
      ...address,
      postcode: 'ZXI 1AA',
      'last-inspection': '31/02/2020',
      'open-c2': 'two',
    })
    expect(outcome.kind).toBe('rejected')
    expect(outcome).toMatchObject({
      problems: [
        { row: 7, field: 'postcode', severity: 'rejected', why: 'postcode', cell: 'ZXI 1AA' },
        { field: 'last-inspection', why: 'impossible date', cell: '31/02/2020' },
        { field: 'open-c2', why: 'not a number', cell: 'two' },
      ],
    })
  })

  it('needs an address', () => {
    expect(readRow({ reference: 'QH-1', postcode: 'ZX2 3QT', built: 1931 })).toMatchObject({
      kind: 'rejected',
      problems: [{ why: 'no address' }],
    })
    expect(readRow({ number: '12', postcode: 'ZX2 3QT', built: 1931 })).toMatchObject({
      problems: [{ why: 'no address' }],
    })
    expect(readRow({ street: 'x'.repeat(201), postcode: 'ZX2 3QT' })).toMatchObject({
      problems: [{ why: 'street too long' }],
    })
  })

  it('is not held up by a cell that is no field at all', () => {
    for (const long of [','.repeat(90_000), 'rewireable to be '.repeat(5000), '1/'.repeat(40_000)]) {
      expect(
        readRow({ ...address, address: long, 'board-type': long, 'last-inspection': long }),
      ).toMatchObject({
        kind: 'rejected',
        problems: [{ why: 'text too long' }, { why: 'text too long' }, { why: 'text too long' }],
      })
      expect(guessMapping(['Address', long], [{ number: 2, cells: [long, long] }], today)).toBeTypeOf(
        'object',
      )
    }
  })

  it('refuses a house number that became a date', () => {
    expect(readRow({ ...address, number: { serial: 46000, epoch: 1900 } })).toMatchObject({
      kind: 'rejected',
      problems: [{ field: 'number', why: 'house number turned into a date' }],
    })
  })

  it('leaves out a point on the Irish grid, with a note', () => {
    const outcome = readRow({ ...address, nation: 'NI', easting: 333000, northing: 374000 })
    expect(draftOf(outcome)).toMatchObject({ nation: 'northern-ireland', latitude: null })
    expect(outcome).toMatchObject({
      problems: [{ field: 'easting', severity: 'noted', why: 'Irish grid not read' }],
    })
  })

  it('takes the landlord supply of a block for a communal home', () => {
    const draft = draftOf(
      readRow({ block: 'Herring Court', 'dwelling-type': 'Landlord supply', postcode: 'ZX3 1AA' }),
    )
    expect(draft).toMatchObject({ kind: 'communal', address: 'Herring Court', block: 'Herring Court' })
  })

  it('reads ways, and notes ways that it does not understand', () => {
    expect(draftOf(readRow({ ...address, ways: 'rrrr[bb]u' })).ways).toBe('RRRR[BB]U')
    expect(readRow({ ...address, ways: '8' })).toMatchObject({
      problems: [{ field: 'ways', why: 'ways not understood' }],
    })
  })

  it('notes a next date that lies before the inspection', () => {
    expect(readRow({ ...address, 'last-inspection': '01/05/2024', 'next-due': '01/05/2019' })).toMatchObject({
      kind: 'accepted',
      problems: [{ field: 'next-due', why: 'next due before the inspection' }],
    })
  })

  it('never throws, whatever the cells hold, and neither does the guess', () => {
    const words = fc.constantFrom(
      '31/02/2020',
      'c.',
      '1960s',
      'Q5 2021',
      'RCBO?',
      '=1',
      'Flat',
      '1e400',
      '9999-99-99',
      '12 of May',
      '<',
      '(',
      '\u0000',
    )
    const cell: fc.Arbitrary<Cell> = fc.oneof(
      fc.string({ unit: 'grapheme' }),
      words,
      fc.array(words, { maxLength: 4 }).map((parts) => parts.join(' ')),
      fc.double(),
      fc.integer(),
      fc.boolean(),
      fc.constant(null),
      fc.record({ serial: fc.double(), epoch: fc.constantFrom(1900 as const, 1904 as const) }),
      fc.record({ error: fc.string() }),
    )
    const row = fc.array(cell, { maxLength: IMPORT_FIELDS.length })
    fc.assert(
      fc.property(row, row, (cells, headings) => {
        const reader = createRowReader({ mapping: everyField, headings, today, nation: 'wales' })
        const outcome = reader.read({ number: 1, cells })
        expect(['blank', 'total', 'accepted', 'rejected']).toContain(outcome.kind)
        const mapping = guessMapping(headings, [{ number: 1, cells }], today)
        expect(new Set(Object.values(mapping)).size).toBe(Object.keys(mapping).length)
      }),
      { numRuns: 400 },
    )
  })
})
