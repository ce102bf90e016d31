/** What the map is handed for the part of the ground on screen. Types only. */
import { type BoardType } from '@/lib/homes/board-type'
import { type Standing } from '@/lib/homes/standing'

/** West, south, east, north [degrees]. */
export type Box = readonly [west: number, south: number, east: number, north: number]

export type Cluster = {
  readonly longitude: number
  readonly latitude: number
  /** what holds all of its homes */
  readonly box: Box
  readonly homes: number
  readonly boards: Readonly<Record<BoardType, number>>
  readonly highestScore: number
}

export type HomePoint = {
  readonly id: string
  readonly address: string
  readonly longitude: number
  readonly latitude: number
  readonly boardType: BoardType
  readonly standing: Standing
  readonly score: number
}

export type HomesOnMap = {
  readonly clusters: readonly Cluster[]
  readonly points: readonly HomePoint[]
  readonly inBox: number
  readonly placed: number
  readonly unplaced: number
  readonly extent: Box | null
}
