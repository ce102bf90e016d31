import { type BoardType } from '@/lib/homes/board-type'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { BoardStrip } from './board-strip'
import { StreetHome, type StreetHomeYear } from './street-home'

type OnTheStreet = {
  readonly year: StreetHomeYear
  readonly ways: string | null
  readonly boardType: BoardType
  readonly rcdCover: RcdCover
  readonly name: string
  readonly meaning: string
}

/** Worst first. Invented homes; what each board means is common knowledge of the trade. */
const STREET: readonly OnTheStreet[] = [
  {
    year: 1911,
    ways: 'RRRRX',
    boardType: 'rewireable',
    rcdCover: 'none',
    name: 'Rewireable fuses',
    meaning: 'A bare wire that anybody can replace with a thicker one. Nothing cuts a shock short.',
  },
  {
    year: 1964,
    ways: null,
    boardType: 'unknown',
    rcdCover: 'unknown',
    name: 'Not known',
    meaning: 'Nobody has looked. It never counts as good news, so somebody should.',
  },
  {
    year: 1937,
    ways: 'BBBBB',
    boardType: 'breakers',
    rcdCover: 'none',
    name: 'Breakers, no RCD',
    meaning: 'Nobody can fit the wrong wire. A shock is still not cut short.',
  },
  {
    year: 1983,
    ways: '[BB]BB',
    boardType: 'breakers',
    rcdCover: 'sockets',
    name: 'An RCD on the sockets',
    meaning: 'The circuits over the bracket are covered against shock. The rest are not.',
  },
  {
    year: 2019,
    ways: 'OOOOO',
    boardType: 'rcbo',
    rcdCover: 'all',
    name: 'RCBOs',
    meaning: 'Each circuit guards itself against overload, short circuit and shock.',
  },
]

/** One street, its consumer units worst to best, and what each means for those who live there. */
export function Street() {
  return (
    <ol className="grid lg:grid-cols-5">
      {STREET.map((home, at) => (
        <li
          key={home.year}
          className="grid grid-cols-[7.5rem_minmax(0,1fr)] gap-x-4 max-lg:border-b max-lg:border-line max-lg:py-5 max-lg:last:border-b-0 sm:grid-cols-[11rem_minmax(0,1fr)] lg:block"
        >
          <StreetHome
            year={home.year}
            runsOn={at === 0}
            className="block w-full max-lg:row-span-2 max-lg:self-start"
          />
          <div className="lg:pr-5 lg:pl-[4.5%]">
            <div className="lg:flex lg:h-18 lg:items-start">
              <BoardStrip ways={home.ways} boardType={home.boardType} rcdCover={home.rcdCover} size="card" />
            </div>
            <p className="mt-2 font-display text-lg font-bold">{home.name}</p>
            <p className="text-sm text-slate">Built {home.year}</p>
            <p className="mt-1.5 lg:max-w-[15rem]">{home.meaning}</p>
          </div>
        </li>
      ))}
    </ol>
  )
}
