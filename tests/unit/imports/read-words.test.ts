// The words of stock lists: common practice, no source.
import { describe, expect, it } from 'vitest'
import { type Cell } from '@/lib/imports/cell'
import { saysUnknown } from '@/lib/imports/fold-words'
import { readAssessment } from '@/lib/imports/read-assessment'
import { readDwellingType } from '@/lib/imports/read-dwelling-type'
import { readKind } from '@/lib/imports/read-kind'
import { readNation } from '@/lib/imports/read-nation'
import { readTenure } from '@/lib/imports/read-tenure'
import { readWiring } from '@/lib/imports/read-wiring'
import { readingOf } from './reading-of'

describe('wiring', () => {
  it.each([
    ['PVC', 'pvc'], ['pvc/pvc', 'pvc'], ['T&E', 'pvc'], ['twin and earth', 'pvc'], ['rubber', 'rubber'], ['VIR', 'rubber'],
    ['V.I.R.', 'rubber'], ['TRS', 'rubber'], ['lead sheathed', 'lead'], ['MICC', 'mineral'], ['pvc & rubber', 'mixed'],
    ['mixed', 'mixed'], ['?', 'unknown'], ['', 'unknown'], ['old', 'unknown'], ['PVC?', 'unknown'],
  ])('%j is %s', (text, wiring) => {
    expect(readingOf(readWiring(text))).toBe(wiring)
  }) // prettier-ignore
})

describe('dwelling type', () => {
  it.each([
    ['semi', 'semi-detached'], ['Semi-Detached House', 'semi-detached'], ['SD', 'semi-detached'], ['detached', 'detached'],
    ['Det', 'detached'], ['end terrace', 'end-terrace'], ['End of terrace', 'end-terrace'], ['ET', 'end-terrace'],
    ['mid terrace', 'mid-terrace'], ['MT', 'mid-terrace'], ['Mid-terraced house', 'mid-terrace'], ['bungalow', 'bungalow'],
    ['Semi detached bungalow', 'bungalow'], ['flat', 'flat'], ['Ground floor flat', 'flat'], ['Apartment', 'flat'],
    ['flat above shop', 'flat'], ['maisonette', 'maisonette'], ['Masionette', 'maisonette'], ['bedsit', 'bedsit'],
    ['studio flat', 'bedsit'], ['house', 'unknown'], ['terraced', 'unknown'], ['?', 'unknown'],
    ['Garage', '! not a home'], ['Shop', '! not a home'],
  ])('%j is %s', (text, type) => {
    expect(readingOf(readDwellingType(text))).toBe(type)
  }) // prettier-ignore
})

describe('kind', () => {
  it.each([
    ['Landlord supply', 'communal'],
    ['Communal', 'communal'],
    ['block', 'communal'],
    ['Flat', 'dwelling'],
    ['', 'dwelling'],
  ])('%j is %s', (text, kind) => {
    expect(readKind(text)).toBe(kind)
  })
})

describe('tenure', () => {
  it.each([
    ['Social rent', 'social-rent'], ['General needs', 'social-rent'], ['GN', 'social-rent'], ['Secure tenancy', 'social-rent'],
    ['Assured', 'social-rent'], ['Sheltered', 'social-rent'], ['Affordable rent', 'affordable-rent'], ['AR', 'affordable-rent'],
    ['Private rent', 'private-rent'], ['PRS', 'private-rent'], ['AST', 'private-rent'], ['Assured shorthold', 'private-rent'],
    ['Standard occupation contract', 'private-rent'], ['Market rent', 'market-rent'], ['Shared ownership', 'shared-ownership'],
    ['S/O', 'shared-ownership'], ['Leasehold', 'leasehold'], ['LH', 'leasehold'], ['Leaseholder', 'leasehold'],
    ['intermediate', 'unknown'], ['void', 'unknown'], ['', 'unknown'],
  ])('%j is %s', (text, tenure) => {
    expect(readingOf(readTenure(text))).toBe(tenure)
  }) // prettier-ignore
})

describe('nation', () => {
  it.each([
    ['England', 'england'], ['Cymru', 'wales'], ['Scot', 'scotland'], ['N.I.', 'northern-ireland'], ['Northern Ireland', 'northern-ireland'],
    ['', null], ['?', null], ['UK', '! nation not known'], ['GB', '! nation not known'],
  ])('%j is %s', (text, nation) => {
    expect(readingOf(readNation(text))).toBe(nation)
  }) // prettier-ignore
})

describe('assessment', () => {
  it.each([
    ['SAT', 'satisfactory'], ['Pass', 'satisfactory'], ['Satisfactory', 'satisfactory'], ['S', 'satisfactory'], ['OK', 'satisfactory'],
    ['UNSAT', 'unsatisfactory'], ['Unsatisfactory', 'unsatisfactory'], ['Un-satisfactory', 'unsatisfactory'],
    ['Not satisfactory', 'unsatisfactory'], ['Fail', 'unsatisfactory'], ['U', 'unsatisfactory'], ['', null], ['n/k', null],
    ['Unsatisfactory - now satisfactory', null], ['amber', null],
  ])('%j is %s', (text, assessment) => {
    expect(readingOf(readAssessment(text))).toBe(assessment)
  }) // prettier-ignore
})

it.each<[Cell, boolean]>([
  ['?', true], ['??', true], ['N/K', true], ['tbc', true], ['Not known', true], ['not sure', true], ['-', true],
  ['-'.repeat(40), true],
  ['unknown - no access to the cupboard', true],
  ['none', false], ['no', false], ['0', false],
])('%j says that it is not known: %j', (text, unknown) => {
  expect(saysUnknown(String(text))).toBe(unknown)
}) // prettier-ignore
