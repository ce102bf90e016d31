// Trade slang: common practice, no source. The 30 mA limit: BS 7671 regulation 415.1.1.
import { describe, expect, it } from 'vitest'
import { readRcdCover } from '@/lib/imports/read-rcd-cover'
import { readingOf } from './reading-of'

describe('RCD cover', () => {
  it.each([
    ['none', 'none'],
    ['Not RCD protected', 'none'],
    ['unprotected', 'none'],
    ['some sockets', 'part'],
    ['kitchen sockets only', 'part'],
    ['sockets no', 'unknown'],
    ['RCCB', 'part'],
    [2, 'part'], ['N', 'none'], ['no', 'none'], ['No RCD', 'none'], ['not fitted', 'none'], ['0', 'none'], [false, 'none'],
    ['No - sockets unprotected', 'none'],
    ['skts', 'sockets'], ['sockets', 'sockets'], ['Yes - sockets only', 'sockets'], ['all sockets', 'sockets'], ['Socket outlets', 'sockets'],
    ['split', 'part'], ['split load', 'part'], ['part', 'part'], ['Partial', 'part'], ['not all circuits', 'part'],
    ['all except lights', 'part'], ['shower only', 'part'], ['sockets & shower', 'part'], ['dual RCD', 'part'],
    ['all', 'all'], ['All circuits', 'all'], ['Y - all ccts', 'all'], ['RCBO', 'all'], ['whole board', 'all'], ['RCD main switch', 'all'],
    ['n/k', 'unknown'], ['?', 'unknown'], ['', 'unknown'], [null, 'unknown'], ['-', 'unknown'], ['no data', 'unknown'],
    ['100mA', 'unknown'], ['sockets?', 'unknown'], ['tails', 'unknown'],
    ['yes', 'part'], ['Y', 'part'], [1, 'part'], [true, 'part'], ['30mA', 'part'],
  ])('%j is %s', (cell, cover) => {
    expect(readingOf(readRcdCover(cell))).toBe(cover)
  }) // prettier-ignore

  it('notes that a bare yes does not say how far', () => {
    expect(readRcdCover('yes')).toMatchObject({ note: 'RCD said to be there, how far not given' })
    expect(readRcdCover('100mA')).toMatchObject({ note: 'RCD too coarse to guard against shock' })
    expect(readRcdCover('split')).toMatchObject({ note: null })
  })
})
