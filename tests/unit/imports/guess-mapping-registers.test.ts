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

/** A heading and two homes to a line, as an asset system exports them: sixty columns, most of them not ours. */
const WIDE = `
Place Ref | 00412 | 00413
OS UPRN | 100099000431 | 100099000446
LLPG status | Live | Live
Block Ref | B01 | B01
Block Name | Herring Court | Herring Court
Address Line 1 | Flat 1 | Flat 2
Address Line 2 | Herring Court | Herring Court
Address Line 3 | Quillhaven | Quillhaven
Address Line 4 | Northshire | Northshire
Post Code | ZX3 1AA | ZX3 1AA
Country | England | England
Management Area | Mill Race | Mill Race
Housing Officer | P. Tern | P. Tern
Ward | Saltings | Saltings
Tenure Type | General Needs | Leasehold
Tenancy Start | 01/04/2019 | 03/09/2021
Weekly Rent | 101.2 | 99.4
Void? | N | N
Property Type | Flat | Flat
Build Type | Traditional | Traditional
Construction Year | 1974 | 1974
Storeys | 3 | 3
Floor Level | 0 | 1
Bedrooms | 2 | 1
Bedspaces | 3 | 2
Floor Area | 61 | 48
Heating Type | Gas | Electric
Boiler Install Date | 04/05/2015 | 
Gas Cert Date | 11/02/2026 | 
Gas Cert Expiry | 10/02/2027 | 
EPC Rating | C | D
EPC Date | 01/01/2020 | 02/02/2021
EPC Expiry | 01/01/2030 | 02/02/2031
SAP | 71 | 62
Asbestos Survey Date | 01/06/2012 | 01/06/2012
Asbestos Status | Presumed | None
FRA Date | 01/03/2025 | 01/03/2025
FRA Next Due | 01/03/2027 | 01/03/2027
Legionella Date | 01/03/2024 | 
Lift | N | N
Smoke Alarm Test | 11/02/2026 | 11/02/2026
CO Alarm Test | 11/02/2026 | 
Elec Periodic Date | 05/05/2022 | 17/09/2019
Elec Periodic Outcome | Satisfactory | Unsatisfactory
Elec Periodic Next Due | 05/05/2027 | 17/09/2024
Elec Contractor | Tern & Sons | Tern & Sons
Elec Cert No | E-1 | E-2
No of C1 | 0 | 0
No of C2 | 0 | 2
No of C3 | 1 | 4
No of FI | 0 | 1
Consumer Unit Type | BS EN 60898 | BS3036
CU Location | Hall | Hall
CU Install Date | 2009 | 
RCD Protection | Split load | None
Wiring Type | PVC | Rubber
Rewire Year | 2009 | 
Kitchen Year | 2012 | 2014
X Coordinate | 583700 | 583701
Y Coordinate | 369500 | 369501
Comments |  | key safe
`

describe('whole registers', () => {
  it('a wide export of an asset system', () => {
    const columns = WIDE.trim()
      .split('\n')
      .map((line) => line.split('|').map((cell) => cell.trim() || null))
    expect(columns.length).toBeGreaterThanOrEqual(60)
    const [headings, one, two] = [0, 1, 2].map((at) => columns.map((column) => column[at] ?? null)) as [
      Cell[],
      Cell[],
      Cell[],
    ]
    expect(guess(headings, one, two)).toEqual({
      reference: 'Place Ref',
      uprn: 'OS UPRN',
      block: 'Block Name',
      number: 'Address Line 1',
      address: 'Address Line 2',
      town: 'Address Line 3',
      postcode: 'Post Code',
      nation: 'Country',
      patch: 'Management Area',
      tenure: 'Tenure Type',
      'dwelling-type': 'Property Type',
      built: 'Construction Year',
      bedrooms: 'Bedrooms',
      'last-inspection': 'Elec Periodic Date',
      assessment: 'Elec Periodic Outcome',
      'next-due': 'Elec Periodic Next Due',
      'open-c1': 'No of C1',
      'open-c2': 'No of C2',
      'open-c3': 'No of C3',
      'open-fi': 'No of FI',
      'board-type': 'Consumer Unit Type',
      'rcd-cover': 'RCD Protection',
      wiring: 'Wiring Type',
      rewired: 'Rewire Year',
      easting: 'X Coordinate',
      northing: 'Y Coordinate',
      note: 'Comments',
    })
  })

  it('a small agent’s list', () => {
    const headings = [
      'Property',
      'PC',
      'Landlord',
      'Rent pcm',
      'Gas safe',
      'EPC',
      'Electrics',
      'Elec expires',
      'Fuses',
      'Anything else',
    ]
    expect(
      guess(
        headings,
        [
          '12a Tallow St, Quillhaven',
          'zx1 2ab',
          'Mrs Tern',
          650,
          '03/03/2026',
          'D',
          '14 Feb 2022',
          '14 Feb 2027',
          'trip switches',
          'cat',
        ],
        [
          'Flat 1, 9 Fore Street, Quillhaven',
          'ZX1 5BB',
          'Mr Plover',
          595,
          '09/01/2026',
          'E',
          'June 2019',
          '',
          'old wire fuses',
          '',
        ],
        ['The Old Forge, Ropewalk', 'ZX1 3AD', 'Mr Plover', 800, '', 'C', 'none', '', '?', ''],
      ),
    ).toEqual({
      address: 'Property',
      postcode: 'PC',
      'last-inspection': 'Electrics',
      'next-due': 'Elec expires',
      'board-type': 'Fuses',
    })
  })

  it('a landlord in Wales', () => {
    const headings = [
      'Ref',
      'House name/number',
      'Street',
      'Town',
      'Post code',
      'Contract type',
      'EICR',
      'EICR expires',
      'Board',
      'RCDs',
      'Nation',
    ]
    expect(
      guess(
        headings,
        [
          'W1',
          '3',
          'Heol y Bryn',
          'Aberquill',
          'YX4 1AB',
          'Standard contract',
          '14/12/2021',
          '13/12/2026',
          'MCB',
          'all',
          'Cymru',
        ],
        [
          'W2',
          'Ty Gwyn',
          'Stryd Fawr',
          'Aberquill',
          'YX4 2BD',
          'Standard contract',
          '02/03/2023',
          '01/03/2028',
          'rewireable',
          'none',
          'Wales',
        ],
        ['W3', '17', 'Maes Glas', 'Aberquill', 'YX4 2BE', 'Secure contract', '', '', 'RCBO', 'all', 'Wales'],
      ),
    ).toEqual({
      reference: 'Ref',
      number: 'House name/number',
      street: 'Street',
      town: 'Town',
      postcode: 'Post code',
      tenure: 'Contract type',
      'last-inspection': 'EICR',
      'next-due': 'EICR expires',
      'board-type': 'Board',
      'rcd-cover': 'RCDs',
      nation: 'Nation',
    })
  })

  it('a list whose "UPRN" is the landlord’s own number', () => {
    expect(
      guess(
        ['UPRN', 'Address', 'Postcode'],
        ['HB0012', '1 Ropewalk', 'ZX1 3AD'],
        ['HB0013', '2 Ropewalk', 'ZX1 3AD'],
      ),
    ).toEqual({
      reference: 'UPRN',
      address: 'Address',
      postcode: 'Postcode',
    })
  })

  it('takes each column once, and nothing from an empty sheet', () => {
    expect(guessMapping([], [], today)).toEqual({})
    expect(guessMapping(['Notes', 'Notes'], [], today)).toEqual({ note: 0 })
  })
})
