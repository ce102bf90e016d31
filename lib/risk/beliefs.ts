/**
 * What an unknown fact could be, and how likely each value is. Plain data: a method carries stated defaults, and an
 * organisation's own homes can teach others, for the portfolio or for one block.
 *
 * The shape is a tree. The era of the house bears on when its wiring was put in; that bears on the insulation and
 * on the board; the board bears on how far an RCD reaches. Known facts inform all that hangs with them, either way.
 */
import { type BoardType } from '@/lib/homes/board-type'
import { type DwellingType } from '@/lib/homes/dwelling-type'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type Wiring } from '@/lib/homes/wiring'
import { type EraKey, type WiringPeriodKey } from './eras'
import { type Basis } from './assessment'

export type KnownBoardType = Exclude<BoardType, 'unknown'>
export type KnownRcdCover = Exclude<RcdCover, 'unknown'>
export type KnownWiring = Exclude<Wiring, 'unknown'>
export type KnownDwellingType = Exclude<DwellingType, 'unknown'>

/** A state that an inspection of unknown date could be in. */
export type InspectionBelief = {
  readonly state: 'in date' | 'lapsed' | 'never'
  /** in date: part of its term gone [0 to 1]; lapsed: years since; never: 0 */
  readonly extent: number
  readonly share: number
}

/** Shares add to 1 in each row. */
export type Beliefs = {
  readonly era: Readonly<Record<EraKey, number>>
  readonly dwellingType: Readonly<Record<KnownDwellingType, number>>
  readonly wiringPeriod: Readonly<Record<EraKey, Readonly<Record<WiringPeriodKey, number>>>>
  readonly wiring: Readonly<Record<WiringPeriodKey, Readonly<Record<KnownWiring, number>>>>
  readonly boardType: Readonly<Record<WiringPeriodKey, Readonly<Record<KnownBoardType, number>>>>
  readonly rcdCover: Readonly<Record<KnownBoardType, Readonly<Record<KnownRcdCover, number>>>>
  readonly inspection: readonly InspectionBelief[]
  readonly basis: Basis
  readonly source: string
}

/** Best protection last: from the value that adds most to a likelihood to the one that adds least. */
export const KNOWN_BOARD_TYPES = ['rewireable', 'mixed', 'cartridge', 'breakers', 'rcbo'] as const
export const KNOWN_RCD_COVERS = ['none', 'sockets', 'part', 'all'] as const
export const KNOWN_WIRINGS = ['lead', 'rubber', 'mixed', 'mineral', 'pvc'] as const
