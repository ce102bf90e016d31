/**
 * The first stated defaults for unknown facts. Judgements, leaning to the cautious side: homes of unknown
 * protection are given worse boards and less RCD cover than the national surveys of known ones show.
 * @source what was fitted when: trade accounts of rubber until the early 1960s, PVC from 1955, rewireable boards until
 *   the 1980s, cartridge fuses until 2010, breakers from 1965 and usual from 1991 (search excerpts); RCDs on sockets
 *   since 1981 and on most circuits since 2008 (editions of the Wiring Regulations, from memory). England 2014: 59
 *   to 77 % of rented homes had all five modern features (English Housing Survey). Stock by era: before 1919 is 21 %
 *   in England, 26 % in Wales (Electrical Safety First); other eras from memory
 */
import { type Beliefs } from './beliefs'

/**
 * When a home was last wired. One share for each time, and a newer home has the shares of the times that it has
 * stood, so that of two homes the older never has the newer wiring. Homes since 1980 mostly keep what they were
 * built with.
 */
const BEFORE_1946 = {
  'before-1946': 0.06,
  '1946-65': 0.12,
  '1966-79': 0.22,
  '1980-91': 0.2,
  '1992-2007': 0.22,
  '2008-on': 0.18,
}
const since = (
  shares: typeof BEFORE_1946,
  gone: readonly (keyof typeof BEFORE_1946)[],
): typeof BEFORE_1946 => {
  const left = 1 - gone.reduce((sum, key) => sum + shares[key], 0)
  const part = (key: keyof typeof BEFORE_1946) => (gone.includes(key) ? 0 : shares[key] / left)
  return {
    'before-1946': part('before-1946'),
    '1946-65': part('1946-65'),
    '1966-79': part('1966-79'),
    '1980-91': part('1980-91'),
    '1992-2007': part('1992-2007'),
    '2008-on': part('2008-on'),
  }
}
const SINCE_1946 = since(BEFORE_1946, ['before-1946'])
const SINCE_1966 = since(BEFORE_1946, ['before-1946', '1946-65'])
const NONE = { 'before-1946': 0, '1946-65': 0, '1966-79': 0, '1980-91': 0, '1992-2007': 0, '2008-on': 0 }
const SINCE_1980 = { ...NONE, '1980-91': 0.5, '1992-2007': 0.28, '2008-on': 0.22 }
const SINCE_1992 = { ...NONE, '1992-2007': 0.78, '2008-on': 0.22 }
const SINCE_2008 = { ...NONE, '2008-on': 1 }

export const FIRST_BELIEFS: Beliefs = {
  era: {
    'before-1920': 0.21,
    '1920-45': 0.16,
    '1946-65': 0.2,
    '1966-79': 0.18,
    '1980-91': 0.09,
    '1992-2007': 0.1,
    '2008-on': 0.06,
  },
  dwellingType: {
    detached: 0.14,
    'semi-detached': 0.24,
    'end-terrace': 0.09,
    'mid-terrace': 0.19,
    bungalow: 0.09,
    flat: 0.2,
    maisonette: 0.03,
    bedsit: 0.02,
  },
  wiringPeriod: {
    'before-1920': BEFORE_1946,
    '1920-45': BEFORE_1946,
    '1946-65': SINCE_1946,
    '1966-79': SINCE_1966,
    '1980-91': SINCE_1980,
    '1992-2007': SINCE_1992,
    '2008-on': SINCE_2008,
  },
  wiring: {
    'before-1946': { lead: 0.2, rubber: 0.5, mixed: 0.25, mineral: 0.01, pvc: 0.04 },
    '1946-65': { lead: 0.03, rubber: 0.27, mixed: 0.25, mineral: 0.05, pvc: 0.4 },
    '1966-79': { lead: 0.001, rubber: 0.009, mixed: 0.06, mineral: 0.03, pvc: 0.9 },
    '1980-91': { lead: 0.0001, rubber: 0.0019, mixed: 0.028, mineral: 0.02, pvc: 0.95 },
    '1992-2007': { lead: 0.0001, rubber: 0.0009, mixed: 0.019, mineral: 0.01, pvc: 0.97 },
    '2008-on': { lead: 0, rubber: 0.0001, mixed: 0.0099, mineral: 0.01, pvc: 0.98 },
  },
  boardType: {
    'before-1946': { rewireable: 0.38, mixed: 0.1, cartridge: 0.12, breakers: 0.32, rcbo: 0.08 },
    '1946-65': { rewireable: 0.31, mixed: 0.09, cartridge: 0.12, breakers: 0.38, rcbo: 0.1 },
    '1966-79': { rewireable: 0.21, mixed: 0.07, cartridge: 0.11, breakers: 0.47, rcbo: 0.14 },
    '1980-91': { rewireable: 0.11, mixed: 0.045, cartridge: 0.085, breakers: 0.58, rcbo: 0.18 },
    '1992-2007': { rewireable: 0.02, mixed: 0.025, cartridge: 0.045, breakers: 0.69, rcbo: 0.22 },
    '2008-on': { rewireable: 0.002, mixed: 0.003, cartridge: 0.01, breakers: 0.6, rcbo: 0.385 },
  },
  rcdCover: {
    rewireable: { none: 0.68, sockets: 0.18, part: 0.12, all: 0.02 },
    mixed: { none: 0.6, sockets: 0.21, part: 0.16, all: 0.03 },
    cartridge: { none: 0.56, sockets: 0.25, part: 0.15, all: 0.04 },
    breakers: { none: 0.2, sockets: 0.3, part: 0.2, all: 0.3 },
    rcbo: { none: 0.005, sockets: 0.02, part: 0.075, all: 0.9 },
  },
  inspection: [
    { state: 'in date', extent: 0.5, share: 0.4 },
    { state: 'lapsed', extent: 3, share: 0.25 },
    { state: 'lapsed', extent: 10, share: 0.2 },
    { state: 'never', extent: 0, share: 0.15 },
  ],
  basis: 'judgement',
  source: 'Stated default by era, on the cautious side',
}
