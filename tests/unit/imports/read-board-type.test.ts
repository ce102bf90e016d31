// Trade slang: common practice, no source. Standards: BS 3036, BS 1361, BS 88, BS 3871, BS EN 60898, BS EN 61009.
import { describe, expect, it } from 'vitest'
import { readBoardType } from '@/lib/imports/read-board-type'

const read = (text: string) => {
  const reading = readBoardType(text)
  return reading.ok ? [reading.value.boardType, reading.value.cover] : reading.why
}

describe('the type of a consumer unit', () => {
  it.each([
    ['Rewireable', 'rewireable', null],
    ['REWIREABLE ', 'rewireable', null],
    ['rewirable', 'rewireable', null],
    ['re-wireable fuses', 'rewireable', null],
    ['Re wirable fuse board', 'rewireable', null],
    ['BS3036', 'rewireable', null],
    ['BS 3036 semi-enclosed', 'rewireable', null],
    ['Old fuse box (wire)', 'rewireable', null],
    ['fuse wire carriers', 'rewireable', null],
    ['wired fuses', 'rewireable', null],
    ['Wire fuses, no RCD', 'rewireable', 'none'],
    ['RW', 'rewireable', null],
    ['rewireable fuses with RCD for sockets', 'rewireable', 'sockets'],
    ['cartridge', 'cartridge', null],
    ['Cartridge fuses', 'cartridge', null],
    ['BS 1361', 'cartridge', null],
    ['BS88 fuses', 'cartridge', null],
    ['HRC fuses', 'cartridge', null],
    ['MCB', 'breakers', null],
    ['MCBs', 'breakers', null],
    ['mcb board', 'breakers', null],
    ['BS EN 60898', 'breakers', null],
    ['BS 3871 type 2', 'breakers', null],
    ['Circuit breakers', 'breakers', null],
    ['Miniature circuit breakers', 'breakers', null],
    ['trip switches', 'breakers', null],
    ['breakers with one RCD', 'breakers', 'part'],
    ['MCB + RCD main switch', 'breakers', 'all'],
    ['MCBs, no RCD', 'breakers', 'none'],
    ['Split load', 'breakers', 'part'],
    ['split-load board', 'breakers', 'part'],
    ['dual RCD board', 'breakers', 'part'],
    ['MCB/RCBO', 'breakers', 'part'],
    ['RCBO', 'rcbo', null],
    ['RCBOs', 'rcbo', null],
    ['All RCBO', 'rcbo', 'all'],
    ['full RCBO board', 'rcbo', 'all'],
    ['BS EN 61009', 'rcbo', null],
    ['Residual current breakers with overcurrent protection', 'rcbo', null],
    ['Mixed MCB / rewireable', 'mixed', null],
    ['part rewireable', 'mixed', null],
    ['MCBs and one BS 3036', 'mixed', null],
    ['was rewireable, now MCBs', 'breakers', null],
    ['Rewireable replaced with MCB 2015', 'breakers', null],
    ['upgraded to RCBO 2019', 'rcbo', null],
    ['rewireable - to be replaced with RCBO', 'rewireable', null],
    ['Rewireable, upgrade to MCB planned', 'rewireable', null],
    ['MCBs (not rewireable)', 'breakers', null],
    ['rewireable (now MCB)', 'breakers', null],
    ['MCB upgraded from rewireable', 'breakers', null],
    ['BSEN60898', 'breakers', null],
    ['upgrade required', 'unknown', null],
    ['TBC', 'unknown', null],
    ['n/k', 'unknown', null],
    ['?', 'unknown', null],
    ['', 'unknown', null],
    ['not sure', 'unknown', null],
    ['metal-clad consumer unit', 'unknown', null],
    ['old fuse box', 'unknown', null],
    ['fully rewired 2015', 'unknown', null],
    ['RCD', 'unknown', 'part'],
    ['RCCB', 'unknown', 'part'],
    ['rewireable?', 'unknown', null],
    ['mixed', 'unknown', null],
  ])('%j is %s, cover %s', (text, boardType, cover) => {
    expect(read(text)).toEqual([boardType, cover])
  })

  it('notes what it did not understand, and says nothing of what is plainly not known', () => {
    expect(readBoardType('metal-clad consumer unit')).toMatchObject({ note: 'consumer unit not understood' })
    expect(readBoardType('TBC')).toMatchObject({ note: null })
    expect(readBoardType('RCBO/MCB')).toMatchObject({ note: 'RCBOs on some ways' })
    expect(readBoardType({ error: '#REF!' })).toMatchObject({ why: 'formula error' })
  })
})
