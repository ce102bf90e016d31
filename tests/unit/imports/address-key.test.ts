import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { addressKey, foldAddress } from '@/lib/imports/address-key'
import { composeAddress, splitTown } from '@/lib/imports/compose-address'

const home = { address: '4 Lantern Lane', town: 'Quillhaven', postcode: 'ZX2 3QT', kind: 'dwelling' } as const

describe('the key of an address', () => {
  it.each([
    ['Flat 2, Herring Court', 'flat 2 Herring Ct.'],
    ['12 Wickfield Road', '12 WICKFIELD RD'],
    ['7 Cooper’s Yard', "7 Cooper's yard"],
    ['No. 7 Fore Street', '7 fore st'],
    ['12 A Ropewalk', '12a Ropewalk'],
    ['Apartment 3, The Maltings', 'Apt 3 The Maltings'],
    ['07 Café Row', '7 Cafe Row'],
  ])('%j and %j are one home', (one, other) => {
    expect(foldAddress(one)).toBe(foldAddress(other))
  })

  it.each([
    ['12 Wickfield Road', '12 Wickfield Close'],
    ['1 Fore Street', '11 Fore Street'],
    ['Flat 1, 2 Fore Street', 'Flat 2, 1 Fore Street'],
  ])('%j and %j are two', (one, other) => {
    expect(foldAddress(one)).not.toBe(foldAddress(other))
  })

  it('holds the postcode, or the town where there is none, and says communal', () => {
    expect(addressKey(home)).toBe('4 lantern ln|ZX23QT')
    expect(addressKey({ ...home, postcode: null })).toBe('4 lantern ln|quillhaven')
    expect(addressKey({ ...home, kind: 'communal' })).toBe('communal|4 lantern ln|ZX23QT')
  })

  it('is its own key: folding twice changes nothing', () => {
    const words = fc.constantFrom(
      'Road',
      'no',
      'No.',
      'Flat',
      'A',
      'b',
      '012',
      '7',
      '0',
      'Street',
      '’s',
      'é',
      'ß',
      'number',
      '&',
      'Saint',
    )
    const text = fc.oneof(
      fc.string({ unit: 'grapheme' }),
      fc.array(words).map((parts) => parts.join(' ')),
    )
    fc.assert(
      fc.property(text, (address) => {
        const once = foldAddress(address)
        expect(foldAddress(once)).toBe(once)
      }),
      { numRuns: 500 },
    )
  })
})

describe('an address from its columns', () => {
  const none = { number: '', block: '', street: '', address: '', town: '' }
  it.each([
    [{ number: '12', street: 'Ropewalk' }, '12 Ropewalk'],
    [{ number: '12a', street: 'Ropewalk', block: '' }, '12a Ropewalk'],
    [{ number: 'Flat 11', street: 'Herring Court', block: 'Herring Court' }, 'Flat 11, Herring Court'],
    [{ number: 'Flat 3', street: 'Fore Street', block: 'Signal House' }, 'Flat 3, Signal House, Fore Street'],
    [{ number: '3', address: 'Lantern Lane' }, '3 Lantern Lane'],
    [{ number: '3', address: '3 Lantern Lane' }, '3 Lantern Lane'],
    [{ address: 'Flat 3', street: 'Fore Street' }, 'Flat 3, Fore Street'],
    [{ street: 'The Old Mill' }, 'The Old Mill'],
  ])('%j is %j', (parts, address) => {
    expect(composeAddress({ ...none, ...parts }).address).toBe(address)
  })

  it.each([
    ['4 Lantern Lane, Quillhaven', '4 Lantern Lane', 'Quillhaven'],
    ['Flat 2, Herring Court', 'Flat 2, Herring Court', null],
    ['Flat 2, Herring Court, Quillhaven', 'Flat 2, Herring Court', 'Quillhaven'],
    ['Flat 2, Herringbone', 'Flat 2, Herringbone', null],
    ['4 Lantern Lane', '4 Lantern Lane', null],
    [
      'Flat 3, Signal House, 9 Fore Street, Saltings, Quillhaven',
      'Flat 3, Signal House, 9 Fore Street',
      'Saltings, Quillhaven',
    ],
  ])('%j parts into %j and %j', (text, address, town) => {
    expect(splitTown(text)).toEqual({ address, town })
  })

  it('takes a postcode out of the address', () => {
    expect(composeAddress({ ...none, address: '4 Lantern Lane, Quillhaven ZX2 3QT' })).toEqual({
      address: '4 Lantern Lane',
      town: 'Quillhaven',
      postcode: 'ZX2 3QT',
    })
  })
})
