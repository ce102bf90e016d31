// Headings of stock lists: common practice, no source. Every register here is invented.
import { describe, expect, it } from 'vitest'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { type Cell, type SheetRow } from '@/lib/imports/cell'
import { guessMapping } from '@/lib/imports/guess-mapping'
import { mappingToFile } from '@/lib/imports/mapping-from-file'

const today = calendarDay('2026-12-01')
const rowsOf = (...rows: (readonly Cell[])[]): SheetRow[] =>
  rows.map((cells, at) => ({ number: at + 2, cells }))

/** What each field was guessed to be called, for headings and rows of cells. */
const guess = (headings: readonly Cell[], ...rows: (readonly Cell[])[]) =>
  mappingToFile(guessMapping(headings, rowsOf(...rows), today), headings)

/** One column under a heading, beside an address so that it is a list at all. */
const guessOne = (heading: string, ...cells: readonly Cell[]) => {
  const { address: _, ...rest } = guess(
    ['Address', heading],
    ...cells.map((cell, at) => [`${at + 1} Lantern Lane`, cell]),
  )
  return Object.keys(rest)
}

describe('one heading in its dialects', () => {
  const past = ['03/05/2020', '11/06/2022', '24/03/2021']
  const ahead = ['03/05/2027', '11/06/2028', '24/03/2029']
  it.each<[string, string, readonly Cell[]]>([
    ['reference', 'Prop Ref|Property ID|Asset no|Property reference|Unit Ref|Asset ID|Ref', ['QH-1001', 'QH-1002', 'QH-1003']],
    ['uprn', 'UPRN|Unique Property Reference Number|OS UPRN', [100099000005, '100099000008', '1.00099E+11']],
    ['number', 'No|House number|House No.|Door no|Flat/House No|Number', ['1', 'Flat 2', '12a']],
    ['street', 'Street|Road|Street name', ['Anchor Row', 'Tallow Street', 'Ropewalk']],
    ['town', 'Town|Post town|Town/City', ['Quillhaven', 'Quillhaven', 'Saltings']],
    ['postcode', 'P’code|Post Code|POSTCODE|Postcode|p/code', ['ZX1 1AA', 'zx12ab', 'ZXI 1AA', 'ZX1 3AD']],
    ['patch', 'Patch|Area|Neighbourhood|Estate|Housing area|Ward', ['North Quay', 'Old Town', 'North Quay']],
    ['tenure', 'Tenure|Tenure type|Tenancy type', ['Social rent', 'Leasehold', 'AST']],
    ['built', 'Yr built|Construction date|Build year|Age|Year of construction|Built|Date built|Property age|Age band', [1931, 'c.1900', '1960s', 'pre war']],
    ['dwelling-type', 'Type|Archetype|Property type|Built form|Dwelling type|House type', ['semi', 'mid terrace', 'flat']],
    ['bedrooms', 'Beds|Bedrooms|No of bedrooms|Bed', [2, 3, 'studio']],
    ['board-type', 'Fuse board|CCU|Consumer unit|DB type|Protection|Fusebox|Type of fuse board|CU|Consumer unit type', ['Rewireable', 'MCBs', 'RCBO', 'TBC']],
    ['rcd-cover', 'RCD?|RCD protection|RCD|RCD cover|RCD fitted (Y/N)', ['none', 'skts', 'All circuits', 'n/k']],
    ['wiring', 'Wiring|Wiring type|Cable type', ['PVC', 'VIR', 'rubber']],
    ['rewired', 'Rewired|Rewire date|Last rewire|Year rewired', [2015, '1998', 2003]],
    ['last-inspection', 'Last EICR|Last test|Test date|EICR date|Inspection date|PIR|Date of last EICR|Elec test date|Electrical inspection date|EICR completed|Fixed wiring test|Last inspected|EICR', past],
    ['next-due', 'Next due|Expiry|Retest|EICR due|EICR expiry date|Next EICR|Next inspection due|EICR valid until|Due date|Re-test date', ahead],
    ['assessment', 'EICR result|Outcome|Result|EICR outcome|Overall assessment|Pass/Fail|EICR status|Sat/Unsat', ['SAT', 'Unsatisfactory', 'Fail']],
    ['open-c1', 'C1|No of C1|C1s|C1 count|Code 1|Open C1', [0, '', 1]],
    ['open-c2', 'C2|No. of C2s|C2 outstanding|Code 2s', [0, 2, 'nil']],
    ['open-c3', 'C3|C3s', [0, 2, 1]],
    ['open-fi', 'FI|F.I.|Further investigation|FI count', [0, 2, 1]],
    ['grid-reference', 'Grid ref|NGR|OS grid reference', ['TG 51409 13177', 'TG 514 131', '']],
    ['note', 'Notes|Comments|Remarks|Additional comments', ['key safe by door', '', 'dog']],
  ])('%s: %s', (field, headings, cells) => {
    for (const heading of headings.split('|')) expect([heading, guessOne(heading, ...cells)]).toEqual([heading, [field]])
  }) // prettier-ignore

  it.each([
    [
      ['Easting', 'Northing'],
      [583174, 371748],
      ['easting', 'northing'],
    ],
    [
      ['X coord', 'Y coord'],
      [583174, 371748],
      ['easting', 'northing'],
    ],
    [
      ['X', 'Y'],
      [583174, 371748],
      ['easting', 'northing'],
    ],
    [
      ['Lat', 'Long'],
      [53.21, 0.75],
      ['latitude', 'longitude'],
    ],
    [
      ['X', 'Y'],
      [0.75, 53.21],
      ['latitude', 'longitude'],
    ],
    [['Latitude', 'Notes'], [53.21, 'dog'], ['note']],
  ])('the pair %j with %j', (headings, cells, fields) => {
    expect(Object.keys(guessMapping(headings, rowsOf(cells, cells), today)).sort()).toEqual(fields)
  })
})

describe('a column of something else is left out', () => {
  const dates = ['03/05/2020', '11/06/2022', '24/03/2021']
  it.each<[string, readonly Cell[]]>([
    ['Gas cert', dates],
    ['Gas safety date', dates],
    ['LGSR expiry', dates],
    ['EPC date', dates],
    ['EPC expiry', ['03/05/2030', '11/06/2031', '24/03/2029']],
    ['Asbestos survey', dates],
    ['Asbestos re-inspection date', dates],
    ['FRA date', dates],
    ['Smoke alarm test date', dates],
    ['Emergency lighting test', dates],
    ['PAT test', dates],
    ['Boiler service due', dates],
    ['Stock condition survey', dates],
    ['Tenancy start date', dates],
    ['Void date', dates],
    ['EICR contractor', ['Harbour Electrical', 'Tern & Sons', 'Harbour Electrical']],
    ['EICR appointment', dates],
    ['EICR cost', [180, 190, 210]],
    ['EICR cert no', ['18-0001', '18-0002', '18-0003']],
    ['EICR remedials completed', dates],
    ['Previous EICR date', dates],
    ['EPC rating', ['C', 'D', 'C']],
    ['Gas outcome', ['Pass', 'Fail', 'Pass']],
    ['Heating type', ['Gas combi', 'Electric', 'Gas combi']],
    ['CCU location', ['hall', 'under stairs', 'kitchen']],
    ['Consumer unit installed', dates],
    ['Area (m2)', [54, 61, 70]],
    ['Bedspaces', [3, 4, 5]],
    ['Rent', [101.5, 99.2, 120]],
    ['Last EICR', [12, 14, 99]],
    ['EICR', ['Y', 'N', 'Y']],
  ])('%s', (heading, cells) => {
    expect(guessOne(heading, ...cells)).toEqual([])
  })

  it('an inspection column cannot lie mostly ahead', () => {
    expect(guessOne('Inspection date', '03/05/2027', '11/06/2028', '24/03/2029')).toEqual([])
  })

  it('a due date after a gas date is the gas one’s', () => {
    const row = ['1 Ropewalk', '01/02/2026', '01/02/2027', 'MCB', '03/05/2020', '03/05/2025']
    const mapping = guess(['Address', 'Gas cert', 'Next due', 'Fuse box', 'Last test', 'Due'], row, row)
    expect(mapping).toMatchObject({ 'last-inspection': 'Last test', 'next-due': 'Due' })
  })

  it('two columns that are equally good are both left to the person', () => {
    const mapping = guess(
      ['Address', 'Last test', 'Beds', 'Test date'],
      ['1 Ropewalk', '03/05/2020', 2, '01/02/2021'],
      ['2 Ropewalk', '04/05/2020', 2, '01/03/2021'],
    )
    expect(mapping).not.toHaveProperty('last-inspection')
  })
})
